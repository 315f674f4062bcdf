import { describe, expect, it } from "vitest";
import { planHouse } from "../../../server/engine/plan/plan-house.ts";
import { fromSi, toSi } from "../../../server/engine/units.ts";
import { typedCover } from "./example-houses.ts";
import { doubleFilmTunnel, glasshouse, gutterRange, plate } from "./scenario-houses.ts";

/** Hand-calculated houses, U-values typed as given. Loads agree within 5 %, temperatures within 1.5 °F or 1 K. */
const WITHIN = 0.05;

function expectNear(value: number, expected: number, within = WITHIN) {
  expect(Math.abs(value / expected - 1), `${value} against ${expected}`).toBeLessThan(within);
}

const inF = (value: number) => fromSi(value, "F");
const btuU = (value: number) => toSi(value, "BtuHFt2F");
const btuH = (watts: number) => fromSi(watts, "BtuH");

describe("double-film tunnel, 30 by 96 ft", () => {
  const film = typedCover(btuU(0.7), 0.68);
  const ends = typedCover(btuU(0.62), 0.7);
  const plan = planHouse(doubleFilmTunnel(film, ends));
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

describe("Venlo-type glasshouse of 1.6 ha", () => {
  const plan = planHouse(glasshouse(typedCover(6.2, 0.8)));
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
  const asPlates = planHouse(gutterRange(sheet, [plate(250, "input", 6)]));

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
    const mistaken = planHouse(gutterRange(sheet, [plate(250, "output", 6)]));
    expect(mistaken.warnings.map((warning) => warning.code)).toContain("inputTakenForOutput");
  });
});
