import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { EngineInputError } from "../../../server/engine/errors.ts";
import type { HouseShape } from "../../../server/engine/geometry/house-shape.ts";
import { planHouse } from "../../../server/engine/plan/plan-house.ts";
import {
  energyScreen,
  everyMonth,
  mirrored,
  northStation,
  nursery,
  shiftedBySixMonths,
  tunnel,
  typedCover,
} from "./example-houses.ts";

/** Path of the first number that is none. */
function firstBadNumber(value: unknown, path = "plan"): string | null {
  if (typeof value === "number") return Number.isFinite(value) ? null : path;
  if (value === null || typeof value !== "object") return null;
  for (const [key, child] of Object.entries(value)) {
    const found = firstBadNumber(child, `${path}.${key}`);
    if (found) return found;
  }
  return null;
}

const shapes: HouseShape[] = [
  { type: "roundArch", lengthM: 30, widthM: 9, riseM: 3.6, wallHeightM: 0.5 },
  { type: "gothicArch", lengthM: 40, widthM: 8, eaveHeightM: 2, ridgeHeightM: 4.4, roofBowM: 0.4 },
  { type: "gable", lengthM: 25, widthM: 8, eaveHeightM: 2.2, ridgeHeightM: 4 },
  { type: "multiSpan", lengthM: 60, spanWidthM: 9.6, spanCount: 5, gutterHeightM: 4, ridgeHeightM: 6 },
  { type: "venlo", lengthM: 100, spanWidthM: 4, spanCount: 20, gutterHeightM: 5, roofSlopeDeg: 22 },
  { type: "monoPitch", lengthM: 8, widthM: 4, lowEaveM: 2, highEaveM: 3 },
];

describe("the plan of a house", () => {
  it("is made of numbers only, for every shape and over wide inputs", () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...shapes),
        fc.double({ min: -66, max: 66, noNaN: true }),
        fc.double({ min: 0, max: 3000, noNaN: true }),
        fc.double({ min: 0.1, max: 4, noNaN: true }),
        fc.double({ min: 2, max: 28, noNaN: true }),
        fc.boolean(),
        (shape, latitudeDeg, elevationM, leakage, setpointC, screened) => {
          const plan = planHouse(
            tunnel({
              shape,
              site: { latitudeDeg, longitudeDeg: 10, elevationM, shelter: "open", frostHollowK: 1 },
              screen: screened ? energyScreen : null,
              leakageAirChangesPerHour: leakage,
              months: everyMonth({ nightSetpointC: setpointC, daySetpointC: setpointC + 2 }),
            }),
          );
          expect(firstBadNumber(plan)).toBeNull();
        },
      ),
      { numRuns: 25 },
    );
  });

  it("is the same every time", () => {
    expect(planHouse(nursery())).toEqual(planHouse(nursery()));
  });

  it("mirrored to the other hemisphere is the same plan six months later", () => {
    const months = everyMonth({}).map((use, m) => ({ ...use, nightSetpointC: 12 + (m % 5) }));
    const north = planHouse(tunnel({ months, ridgeBearingDeg: 90 }));
    const site = { ...tunnel().site, latitudeDeg: -52 };
    const south = planHouse(
      tunnel({ months: shiftedBySixMonths(months), site, climate: mirrored(northStation) }),
    );
    expect(south.sizing.onceInYearsRequiredW).toBeCloseTo(north.sizing.onceInYearsRequiredW, 5);
    expect(((south.sizing.onceInYearsMonth + 5) % 12) + 1).toBe(north.sizing.onceInYearsMonth);
    // The earth is nearer the sun in January, and the months' days differ by one or two.
    expect(south.annual.heaterKwh / north.annual.heaterKwh).toBeCloseTo(1, 1);
  });

  it("needs no less on the rare night than every day, in every month and state", () => {
    for (const month of planHouse(tunnel({ screen: energyScreen })).months) {
      expect(month.onceInYears.screensShut!.requiredHeatW).toBeGreaterThanOrEqual(
        month.everyday.screensShut!.requiredHeatW,
      );
      expect(month.onceInYears.screensOpen!.requiredHeatW).toBeGreaterThanOrEqual(
        month.onceInYears.screensShut!.requiredHeatW,
      );
    }
  });

  it("offers heat that holds both nights, judged with its largest unit out", () => {
    const { sizing } = planHouse(tunnel({ heaters: [] }));
    expect(sizing.installedW).toBe(0);
    expect(sizing.options.length).toBeGreaterThan(1);
    for (const option of sizing.options) {
      expect(option.totalW).toBeGreaterThanOrEqual(sizing.targetW);
      expect(option.holdsOnceInYears).toBe(true);
      expect(option.largestUnitOutSettlesAtC).toBeLessThanOrEqual(16);
    }
    const one = sizing.options.find((option) => option.id === "one")!;
    const two = sizing.options.find((option) => option.id === "two")!;
    expect(two.largestUnitOutSettlesAtC).toBeGreaterThan(one.largestUnitOutSettlesAtC);
  });

  it("counts the hours to the critical temperature, the low end first", () => {
    const { hoursToCriticalLow: low, hoursToCriticalHigh: high } = planHouse(tunnel()).sizing;
    expect(low).toBeGreaterThan(0);
    expect(high).toBeGreaterThan(low!);
    expect(high).toBeLessThan(12);
  });

  it("uses less fuel the better the heater", () => {
    const heaters = tunnel().heaters;
    const poor = planHouse(
      tunnel({ heaters: heaters.map((heater) => ({ ...heater, efficiencyFrac: 0.7 })) }),
    );
    const good = planHouse(
      tunnel({ heaters: heaters.map((heater) => ({ ...heater, basis: "output", efficiencyFrac: 0.95 })) }),
    );
    expect(good.annual.fuelKwhGross).toBeLessThan(poor.annual.fuelKwhGross);
  });

  it("says where each assumption comes from", () => {
    const plan = planHouse(tunnel({ origins: { "leakage.airChanges": "measured", criticalTemp: "guess" } }));
    const of = (field: string) => plan.assumptions.find((assumption) => assumption.field === field);
    expect(of("leakage.airChanges")?.origin).toBe("measured");
    expect(of("criticalTemp")?.origin).toBe("guess");
    expect(of("engine.margin")?.origin).toBe("default");
    for (const assumption of plan.assumptions) expect(assumption.source.length).toBeGreaterThan(3);
  });

  it("names the quantity, its value and the range when it refuses", () => {
    const refused = (change: Parameters<typeof tunnel>[0]) => {
      try {
        planHouse(tunnel(change));
      } catch (error) {
        if (error instanceof EngineInputError) return error.detail.quantity;
        throw error;
      }
      return "nothing";
    };
    expect(refused({ leakageAirChangesPerHour: -1 })).toBe("leakageAirChangesPerHour");
    expect(refused({ months: everyMonth({ nightSetpointC: 200 }) })).toBe("months.nightSetpointC");
    expect(refused({ months: everyMonth({}).slice(1) })).toBe("months");
    expect(refused({ covers: { ...tunnel().covers, roof: typedCover(99) } })).toBe("covers.uValueWM2K");
    expect(refused({ site: { ...tunnel().site, latitudeDeg: 152 } })).toBe("site.latitudeDeg");
    expect(
      refused({ shape: { type: "gable", lengthM: -4, widthM: 8, eaveHeightM: 2, ridgeHeightM: 4 } }),
    ).toBe("lengthM");
    expect(refused({ criticalTempC: Number.NaN })).toBe("criticalTempC");
  });
});
