import { describe, expect, it } from "vitest";
import { houseLosses } from "../../../server/engine/balance/house-losses.ts";
import { degreeDaysNormal } from "../../../server/engine/climate/degree-days.ts";
import { parabolaAt } from "../../../server/engine/energy/parabola.ts";
import { responseLossW, shellResponse } from "../../../server/engine/energy/shell-response.ts";
import { houseModel } from "../../../server/engine/plan/house-model.ts";
import { planClimate } from "../../../server/engine/plan/plan-climate.ts";
import { planMonthEnergy } from "../../../server/engine/plan/plan-energy.ts";
import { energyScreen, everyMonth, tunnel, typedCover } from "../plan/example-houses.ts";

const cover = typedCover(4, 0);
const dark = tunnel({
  covers: { roof: cover, sideWall: cover, endWall: cover },
  months: everyMonth({ nightSetpointC: 16, daySetpointC: 16 }),
});

function month(input: typeof dark, number: number, limitW = Number.POSITIVE_INFINITY) {
  const model = houseModel(input);
  return planMonthEnergy(model, planClimate(model), number, input.months[number - 1]!, limitW);
}

describe("the response of a shell", () => {
  const model = houseModel(tunnel({ screen: energyScreen }));
  const hour = (airTempC: number) => ({
    airTempC,
    skyTempC: airTempC - 14,
    windMS: 3,
    snow: false,
  });
  const response = shellResponse(model.hoursShell, 16, [hour(-20), hour(0), hour(20)], "open");
  const exact = (outdoorC: number, insideC: number, sunWM2: number) =>
    houseLosses(
      { ...model.hoursShell, floorEdgeLossWMK: 0 },
      {
        outside: hour(outdoorC),
        screen: "open",
        air: { fansM3H: 0, leaksM3H: 0, recoveryFrac: 0 },
        groupSunWM2: model.hoursShell.groups.map(() => sunWM2),
      },
      insideC,
    ).totalW;

  it("follows the exact balance within 1 % of its span between the probes", () => {
    const span = exact(-20, 16, 0);
    for (const outdoorC of [-16, -8, 4, 11, 17])
      expect(
        Math.abs(responseLossW(response, outdoorC, 16, []) - exact(outdoorC, 16, 0)) / span,
      ).toBeLessThan(0.01);
  });

  it("follows the inside temperature and absorbed sun within 2 %", () => {
    const span = exact(-20, 16, 0);
    const sun = model.hoursShell.groups.map(() => 400);
    expect(Math.abs(responseLossW(response, -4, 19, []) - exact(-4, 19, 0)) / span).toBeLessThan(0.02);
    expect(Math.abs(responseLossW(response, -4, 16, sun) - exact(-4, 16, 400)) / span).toBeLessThan(0.02);
  });

  it("gives the face where water settles", () => {
    expect(parabolaAt(response.innerFaceC, -20)).toBeLessThan(parabolaAt(response.innerFaceC, 20));
  });
});

describe("energy of a month", () => {
  it("of a dark house in January is its loss coefficient times the degree-hours, within 3 %", () => {
    const energy = month(dark, 1);
    const model = houseModel(dark);
    const balance = houseLosses(
      model.hoursShell,
      {
        outside: { airTempC: 0, skyTempC: 0, windMS: planClimate(model).windMS[0] ?? 0, snow: false },
        screen: "open",
        air: { fansM3H: 0, leaksM3H: 0.75 * model.geometry.volumeM3, recoveryFrac: 0 },
        groupSunWM2: [],
      },
      16,
    );
    const perKelvin = balance.totalW / 16;
    const degreeDays = degreeDaysNormal(16, 0, Math.hypot(4.8, 2), 31);
    expect(Math.abs(energy.heaterKwh / ((perKelvin * degreeDays * 24) / 1000) - 1)).toBeLessThan(0.03);
  });

  it("closes: losses are heater and useful gains", () => {
    for (const number of [1, 3, 5, 7, 10]) {
      const energy = month(tunnel({ screen: energyScreen }), number);
      const losses = Object.values(energy.lossesKwh).reduce((sum, value) => sum + value, 0);
      const gains = Object.values(energy.gainsKwh).reduce((sum, value) => sum + value, 0);
      expect(Math.abs(losses - gains - energy.heaterKwh) / losses).toBeLessThan(0.015);
    }
  });

  it("tells its heater by hour of day, and the hours add up to the month", () => {
    const energy = month(dark, 1);
    const sum = energy.heaterByHourW.reduce((total, watts) => total + watts, 0);
    expect((sum * 31) / 1000).toBeCloseTo(energy.heaterKwh, 6);
    expect(energy.outdoorByHourC.reduce((total, temp) => total + temp, 0) / 24).toBeCloseTo(0, 6);
  });

  it("takes less with a screen and with sun, and more with leaks", () => {
    const clear = typedCover(4, 0.7);
    const sunny = { ...dark, covers: { roof: clear, sideWall: clear, endWall: clear } };
    expect(month(sunny, 3).heaterKwh).toBeLessThan(month(dark, 3).heaterKwh);
    expect(month({ ...dark, screen: energyScreen }, 1).heaterKwh).toBeLessThan(month(dark, 1).heaterKwh);
    expect(month({ ...dark, leakageAirChangesPerHour: 2 }, 1).heaterKwh).toBeGreaterThan(
      month(dark, 1).heaterKwh,
    );
  });

  it("tells hours below the set-point and unmet heat when the heater is small", () => {
    const short = month(dark, 1, 15_000);
    expect(short.unmetKwh).toBeGreaterThan(0);
    expect(short.hoursBelowSetpoint).toBeGreaterThan(100);
    expect(Math.max(...short.heaterByHourW)).toBeLessThanOrEqual(15_000 + 1e-6);
    expect(month(dark, 1, 200_000).hoursBelowSetpoint).toBe(0);
  });

  it("is nothing in a month without use", () => {
    const input = { ...dark, months: everyMonth({ occupied: false }) };
    expect(month(input, 1).heaterKwh).toBe(0);
  });
});
