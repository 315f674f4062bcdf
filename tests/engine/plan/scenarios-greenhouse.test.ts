import { describe, expect, it } from "vitest";
import type { HousePlanInput } from "../../../server/engine/plan/house-input.ts";
import { planHouse } from "../../../server/engine/plan/plan-house.ts";
import { fromSi, toSi } from "../../../server/engine/units.ts";
import { everyMonth, stationWithDesign, tunnel, typedCover } from "./example-houses.ts";

/** Hand-calculated houses, U-values typed as given. Loads agree within 5 %, temperatures within 1.5 °F or 1 K. */
const WITHIN = 0.05;

function expectNear(value: number, expected: number, within = WITHIN) {
  expect(Math.abs(value / expected - 1), `${value} against ${expected}`).toBeLessThan(within);
}

const ft = (value: number) => toSi(value, "ft");
const degF = (value: number) => toSi(value, "F");
const inF = (value: number) => fromSi(value, "F");
const btuU = (value: number) => toSi(value, "BtuHFt2F");
const btuH = (watts: number) => fromSi(watts, "BtuH");

function plate(label: string, kBtuH: number, basis: "input" | "output", count: number) {
  return {
    label,
    typeId: "unit-fan",
    ratedW: toSi(kBtuH, "kBtuH"),
    basis,
    efficiencyFrac: 0.8,
    vented: true,
    burnsFuel: true,
    fuelId: "lpg",
    count,
  };
}

describe("double-film tunnel, 30 by 96 ft", () => {
  const film = typedCover(btuU(0.7), 0.68);
  const ends = typedCover(btuU(0.62), 0.7);
  const plan = planHouse(
    tunnel({
      climate: stationWithDesign(degF(3), degF(-15)),
      shape: { type: "roundArch", lengthM: ft(96), widthM: ft(30), riseM: ft(12), wallHeightM: 0 },
      covers: { roof: film, sideWall: film, endWall: ends },
      leakageAirChangesPerHour: 1,
      floorEdgeLossWMK: 0,
      months: everyMonth({ nightSetpointC: degF(60), daySetpointC: degF(65) }),
      criticalTempC: degF(40),
      heaters: [plate("Unit heater", 150, "input", 2)],
    }),
  );
  const january = plan.months[0]!;

  it("has the taped sizes", () => {
    const roofM2 = january.everyday
      .screensShut!.surfaces.filter((surface) => surface.role === "roof")
      .reduce((sum, surface) => sum + surface.areaM2, 0);
    expectNear(fromSi(roofM2, "ft2"), 3984, 0.01);
    expectNear(fromSi(plan.geometry.volumeM3, "m3") / 0.3048 ** 3, 25_764, 0.01);
  });

  it("needs what the hand calculation says on both nights", () => {
    expectNear(btuH(plan.sizing.everydayRequiredW), 204_400);
    expectNear(btuH(plan.sizing.onceInYearsRequiredW), 268_900);
    expectNear(btuH(plan.sizing.installedW), 240_000, 0.001);
  });

  it("holds the everyday night, settles near 52 °F on the rare one, near 36 °F with one heater out", () => {
    expect(plan.sizing.verdictEveryday).toBe("holds");
    expect(plan.sizing.verdictOnceInYears).toBe("belowSetpoint");
    expect(Math.abs(inF(plan.sizing.settlesAtOnceInYearsC) - 52)).toBeLessThan(1.5);
    expect(Math.abs(inF(january.everyday.largestUnitOut!.settlesAtC) - 36)).toBeLessThan(1.5);
    expect(january.everyday.largestUnitOut!.verdict).toBe("belowCritical");
  });

  it("puts 13 % of the loss on leaks", () => {
    const { lossesW } = january.everyday.screensShut!;
    const total = lossesW.cover + lossesW.sky + lossesW.air + lossesW.ground;
    expect(lossesW.air / total).toBeCloseTo(0.13, 2);
  });
});

function venlo(heaterW: number): HousePlanInput {
  const glass = typedCover(6.2, 0.8);
  return tunnel({
    climate: stationWithDesign(-10, -15),
    shape: {
      type: "venlo",
      lengthM: 160,
      spanWidthM: 4,
      spanCount: 25,
      gutterHeightM: 6,
      roofSlopeDeg: 22.5,
    },
    covers: { roof: glass, sideWall: glass, endWall: glass },
    leakageAirChangesPerHour: 0.5,
    floorEdgeLossWMK: 0,
    screen: {
      name: "Screen",
      emissivityIn: 0.5,
      emissivityOut: 0.3,
      longwaveTransmittance: 0.1,
      solarTransmittance: 0.5,
      savingFrac: 1 - 3.4 / 6.2,
      coverageFrac: 1,
      edgeGapM: 0,
      opensForSnow: true,
    },
    months: everyMonth({ nightSetpointC: 18, daySetpointC: 20 }),
    criticalTempC: 10,
    heaters: [{ ...plate("Boiler", 100, "output", 1), ratedW: heaterW, basis: "output" }],
  });
}

describe("Venlo-type glasshouse of 1.6 ha", () => {
  const plan = planHouse(venlo(3_000_000));
  const january = plan.months[0]!;

  it("has the areas and the volume", () => {
    const area = (roles: string[]) =>
      january.everyday
        .screensShut!.surfaces.filter((surface) => roles.includes(surface.role))
        .reduce((sum, surface) => sum + surface.areaM2, 0);
    expectNear(area(["roof"]), 17_318, 0.001);
    expectNear(area(["sideWall", "endWall"]), 3203, 0.005);
    expectNear(plan.geometry.volumeM3, 102_600, 0.005);
  });

  it("needs 2.68 MW with screens shut and 4.04 MW with screens open", () => {
    expectNear(january.everyday.screensShut!.requiredHeatW, 2.68e6);
    expectNear(january.everyday.screensOpen!.requiredHeatW, 4.04e6);
    expect(Math.abs(january.everyday.screensOpen!.settlesAtC - 10.8)).toBeLessThan(1);
    expectNear(january.everyday.screensShut!.requiredHeatW / plan.geometry.floorAreaM2, 167);
  });

  it("just holds a snow night at -2 °C with screens open", () => {
    expectNear(january.everyday.snowOnRoof!.requiredHeatW, 2.88e6);
    expect(january.everyday.snowOnRoof!.verdict).toBe("holds");
  });

  it("settles at 16.4 °C on the rare night, at 5.8 °C with the screens stuck open", () => {
    expectNear(january.onceInYears.screensShut!.requiredHeatW, 3.16e6);
    expect(Math.abs(january.onceInYears.screensShut!.settlesAtC - 16.4)).toBeLessThan(1);
    expect(Math.abs(january.onceInYears.screensOpen!.settlesAtC - 5.8)).toBeLessThan(1);
    expect(january.onceInYears.screensOpen!.verdict).toBe("belowCritical");
  });
});

describe("gutter-connected range at 5,000 ft, ratings entered as output", () => {
  const sheet = typedCover(btuU(0.65), 0.7);
  const range = (heaters: HousePlanInput["heaters"]) =>
    planHouse(
      tunnel({
        site: {
          latitudeDeg: 40,
          longitudeDeg: 10,
          elevationM: ft(5000),
          shelter: "normal",
          frostHollowK: 0,
        },
        climate: stationWithDesign(degF(-5), degF(-20), ft(5000)),
        shape: {
          type: "multiSpan",
          lengthM: ft(144),
          spanWidthM: ft(30),
          spanCount: 3,
          gutterHeightM: ft(12),
          ridgeHeightM: ft(19.5),
        },
        covers: { roof: sheet, sideWall: sheet, endWall: sheet },
        leakageAirChangesPerHour: 1,
        floorEdgeLossWMK: 0,
        months: everyMonth({ nightSetpointC: degF(65), daySetpointC: degF(68) }),
        criticalTempC: degF(45),
        heaters,
      }),
    );
  const asPlates = range([plate("Unit heater", 250, "input", 6)]);

  it("needs what the hand calculation says in thin air", () => {
    expectNear(btuH(asPlates.sizing.everydayRequiredW), 1_159_000);
    expectNear(btuH(asPlates.sizing.onceInYearsRequiredW), 1_407_000);
  });

  it("gives 960,000 Btu/h after efficiency and height, and settles at 53 and 38 °F", () => {
    expectNear(btuH(asPlates.sizing.installedW), 960_000, 0.01);
    expect(Math.abs(inF(asPlates.sizing.settlesAtEverydayC) - 53)).toBeLessThan(1.5);
    expect(Math.abs(inF(asPlates.sizing.settlesAtOnceInYearsC) - 38)).toBeLessThan(1.5);
    expect(asPlates.sizing.verdictOnceInYears).toBe("belowCritical");
    expect(asPlates.warnings.map((warning) => warning.code)).toContain("thinAir");
  });

  it("catches the input entered as output", () => {
    const mistaken = range([plate("Unit heater", 250, "output", 6)]);
    expect(mistaken.warnings.map((warning) => warning.code)).toContain("inputTakenForOutput");
  });
});
