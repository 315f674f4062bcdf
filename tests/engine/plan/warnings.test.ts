import { describe, expect, it } from "vitest";
import type { HousePlanInput } from "../../../server/engine/plan/house-input.ts";
import { planHouse } from "../../../server/engine/plan/plan-house.ts";
import {
  energyScreen,
  everyMonth,
  northStation,
  nursery,
  stationWithDesign,
  tunnel,
} from "./example-houses.ts";

const codes = (input: HousePlanInput) => planHouse(input).warnings.map((warning) => warning.code);
const heaters = tunnel().heaters;

describe("warnings", () => {
  it("are not given for a sound house", () => {
    const sound = tunnel({ climate: stationWithDesign(-10, -15) });
    expect(planHouse(sound).warnings.filter((warning) => warning.severity !== "note")).toEqual([]);
  });

  it("catch a screen that opens for snow without the heat for it", () => {
    const small = heaters.map((heater) => ({ ...heater, ratedW: 14_000 }));
    const screened = tunnel({
      screen: { ...energyScreen, savingFrac: 0.7 },
      heaters: small,
      climate: stationWithDesign(-2, -4),
    });
    expect(codes(screened)).toContain("snowOpensScreen");
    expect(codes({ ...screened, screen: { ...energyScreen, opensForSnow: false } })).not.toContain(
      "snowOpensScreen",
    );
  });

  it("catch one heater alone, and heat far beyond the need", () => {
    const one = heaters.map((heater) => ({ ...heater, ratedW: 100_000, count: 1 }));
    expect(codes(tunnel({ heaters: one }))).toContain("singleHeater");
    const huge = heaters.map((heater) => ({ ...heater, ratedW: 400_000 }));
    expect(codes(tunnel({ heaters: huge }))).toContain("oversized");
  });

  it("catch burners without a flue", () => {
    const open = heaters.map((heater) => ({ ...heater, vented: false }));
    expect(codes(tunnel({ heaters: open }))).toContain("noFlue");
  });

  it("catch measured air far from the need, both ways", () => {
    const typed = (flowM3H: number) =>
      nursery({ stock: { ...nursery().stock!, ventilation: { mode: "typed", flowM3H } } });
    expect(codes(typed(300))).toContain("ventilationLow");
    expect(codes(typed(9000))).toContain("ventilationHigh");
    expect(codes(typed(1300))).not.toContain("ventilationLow");
  });

  it("catch temperatures and masses that do not fit", () => {
    expect(codes(tunnel({ criticalTempC: 18 }))).toContain("criticalAboveSetpoint");
    expect(codes(tunnel({ months: everyMonth({ nightSetpointC: 40 }) }))).toContain("setpointUnusual");
    const heavy = everyMonth({ nightSetpointC: 28, daySetpointC: 28, headCount: 500, massKg: 90 });
    expect(codes(nursery({ months: heavy }))).toContain("massOutOfRange");
  });

  it("point out a station far away, at another height, or thin on data", () => {
    const far = { ...northStation, latitudeDeg: 54.5 };
    expect(codes(tunnel({ climate: far }))).toContain("stationFar");
    expect(codes(tunnel({ climate: { ...northStation, elevationM: 900 } }))).toContain("stationHeight");
    const thin = { ...northStation, windMS: null, humidityFrac: null };
    expect(codes(tunnel({ climate: thin }))).toContain("climateGaps");
    const typical = { ...northStation, flags: { ...northStation.flags, design: "T" } };
    expect(codes(tunnel({ climate: typical }))).toContain("designFromTypicalYear");
  });

  it("are calm and plain: no exclamation marks, no arrows, an action for each", () => {
    const plans = [
      tunnel({ screen: energyScreen, criticalTempC: 20 }),
      nursery({ stock: { ...nursery().stock!, ventilation: { mode: "typed", flowM3H: 0 } } }),
    ].map(planHouse);
    for (const warning of plans.flatMap((plan) => plan.warnings)) {
      expect(`${warning.message} ${warning.action}`).not.toMatch(/[!→≈~]/);
      expect(warning.action.length).toBeGreaterThan(10);
    }
  });

  it("stand with the gravest first", () => {
    const plan = planHouse(
      nursery({ stock: { ...nursery().stock!, ventilation: { mode: "typed", flowM3H: 0 } } }),
    );
    expect(plan.warnings[0]?.severity).toBe("block");
  });
});
