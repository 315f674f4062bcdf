import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { EngineInputError } from "../../../server/engine/errors.ts";
import {
  altitudeFactor,
  deliveredOutputW,
  rowOutputW,
} from "../../../server/engine/heaters/delivered-output.ts";
import { grossEfficiencyFrac } from "../../../server/engine/heaters/efficiency-basis.ts";
import { preheatOutputW } from "../../../server/engine/heaters/preheat.ts";
import { cyclingLossFrac, stageUse } from "../../../server/engine/heaters/staging.ts";

const plate = {
  ratedW: 100_000,
  basis: "input",
  efficiencyFrac: 0.95,
  burnsFuel: true,
  altitudeM: 0,
} as const;

describe("what a plate is worth", () => {
  it("is less where the efficiency is counted on the net value", () => {
    expect(deliveredOutputW(plate)).toBe(95_000);
    expect(deliveredOutputW({ ...plate, efficiencyBasis: "net", netOverGrossFrac: 0.901 })).toBeCloseTo(
      85_595,
      6,
    );
    expect(() => deliveredOutputW({ ...plate, efficiencyBasis: "net" })).toThrow(/netOverGrossFrac/);
    expect(() => grossEfficiencyFrac(95, "net", 0.9)).toThrow(EngineInputError);
  });

  it("falls with height by the chosen rule, never rises", () => {
    fc.assert(
      fc.property(
        fc.constantFrom("us" as const, "canada" as const, "none" as const),
        fc.double({ min: -400, max: 5000, noNaN: true }),
        fc.double({ min: 0, max: 900, noNaN: true }),
        (rule, altitudeM, higher) => {
          expect(altitudeFactor(altitudeM + higher, rule)).toBeLessThanOrEqual(
            altitudeFactor(altitudeM, rule),
          );
        },
      ),
    );
    expect(altitudeFactor(1000, "canada")).toBe(0.9);
    expect(altitudeFactor(3000, "none")).toBe(1);
  });

  it("counts heaters, a changed fuel, and electricity without loss", () => {
    expect(rowOutputW(plate, 3)).toBe(285_000);
    expect(deliveredOutputW({ ...plate, fuelChangeFactor: 0.9 })).toBeCloseTo(85_500, 6);
    expect(
      deliveredOutputW({ ...plate, basis: "input", efficiencyFrac: 3.2, burnsFuel: false, altitudeM: 2500 }),
    ).toBe(320_000);
    expect(() => deliveredOutputW({ ...plate, efficiencyFrac: 3.2 })).toThrow(/efficiencyFrac is 3.2/);
  });
});

describe("stages", () => {
  const loads = [
    { loadW: 0, hours: 4000 },
    { loadW: 20_000, hours: 3000 },
    { loadW: 45_000, hours: 1500 },
    { loadW: 80_000, hours: 260 },
  ];

  it("give all the heat they can, the first one longest", () => {
    const { stages, shortHours, unmetKwh } = stageUse([30_000, 30_000], loads);
    const wanted = 20 * 3000 + 45 * 1500 + 60 * 260;
    expect(stages.reduce((sum, { heatKwh }) => sum + heatKwh, 0)).toBeCloseTo(wanted, 6);
    expect(stages[0]?.runsFrac).toBeCloseTo(4760 / 8760, 9);
    expect(stages[1]?.runsFrac).toBeCloseTo(1760 / 8760, 9);
    expect(shortHours).toBe(260);
    expect(unmetKwh).toBeCloseTo(20 * 260, 6);
  });

  it("never use a later stage more than an earlier one of its size", () => {
    fc.assert(
      fc.property(
        fc.array(
          fc.record({
            loadW: fc.double({ min: 0, max: 2e5, noNaN: true }),
            hours: fc.double({ min: 1, max: 1000, noNaN: true }),
          }),
          { minLength: 1, maxLength: 12 },
        ),
        (some) => {
          const { stages } = stageUse([25_000, 25_000, 25_000], some);
          stages.slice(1).forEach((stage, index) => {
            expect(stage.usedFrac).toBeLessThanOrEqual((stages[index]?.usedFrac ?? 0) + 1e-9);
          });
        },
      ),
    );
  });

  it("lose by short cycles only where they are too large and cannot turn down", () => {
    expect(cyclingLossFrac(60_000, 40_000, "onOff")).toBe(0);
    expect(cyclingLossFrac(120_000, 40_000, "onOff")).toBeCloseTo(0.035, 9);
    expect(cyclingLossFrac(400_000, 40_000, "onOff")).toBe(0.05);
    expect(cyclingLossFrac(120_000, 40_000, "modulating")).toBe(0);
  });
});

describe("pre-heating", () => {
  const house = {
    capacityJK: 150e6,
    lossCoefficientWK: 2500,
    startTempC: 5,
    wantedTempC: 32,
    outdoorTempC: -5,
  };

  it("reaches the temperature in its hours and takes more heat for fewer of them", () => {
    fc.assert(
      fc.property(fc.double({ min: 1, max: 100, noNaN: true }), (hours) => {
        const outputW = preheatOutputW(house, hours);
        const end = -5 + outputW / 2500;
        const reached = end + (5 - end) * Math.exp((-hours * 3600 * 2500) / 150e6);
        expect(reached).toBeCloseTo(32, 6);
        expect(preheatOutputW(house, hours + 1)).toBeLessThan(outputW);
      }),
    );
  });

  it("never takes less than holding the temperature", () => {
    expect(preheatOutputW(house, 200)).toBeGreaterThanOrEqual(2500 * 37);
    expect(() => preheatOutputW({ ...house, wantedTempC: 0 }, 24)).toThrow(/wantedTempC/);
  });
});
