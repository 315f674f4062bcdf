import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { HousePlanInput } from "../../../server/engine/plan/house-input.ts";
import { houseModel } from "../../../server/engine/plan/house-model.ts";
import { nightBalances, usualNight } from "../../../server/engine/plan/night-balances.ts";
import type { HouseBalance } from "../../../server/engine/plan/plan-types.ts";
import { energyScreen, everyMonth, nursery, stackCover, tunnel, typedCover } from "../plan/example-houses.ts";

function night(input: HousePlanInput, outdoorTempC: number, windMS = 3, unitOutputsW = [20_000, 20_000]) {
  const use = input.months[0]!;
  return { month: 1, use, outdoorTempC, windMS, soilTempC: 9, unitOutputsW };
}

function balanceOf(input: HousePlanInput, outdoorTempC: number, windMS = 3): HouseBalance {
  return usualNight(houseModel(input), night(input, outdoorTempC, windMS));
}

const losses = (b: HouseBalance) => b.lossesW.cover + b.lossesW.sky + b.lossesW.air + b.lossesW.ground;
const gains = (b: HouseBalance) => b.gainsW.sun + b.gainsW.stock + b.gainsW.lights;

const outdoor = fc.double({ min: -35, max: 25, noNaN: true });
const wind = fc.double({ min: 0, max: 15, noNaN: true });

describe("the balance of a house", () => {
  it("closes: losses less gains are the heat that is needed", () => {
    fc.assert(
      fc.property(outdoor, wind, fc.boolean(), (tempC, windMS, barn) => {
        const balance = balanceOf(barn ? nursery() : tunnel({ screen: energyScreen }), tempC, windMS);
        const scale = Math.abs(balance.lossesW.cover) + Math.abs(balance.lossesW.sky) + 1;
        expect(Math.abs(losses(balance) - gains(balance) - balance.requiredHeatW) / scale).toBeLessThan(1e-9);
      }),
      { numRuns: 60 },
    );
  });

  it("adds up over its surfaces", () => {
    const balance = balanceOf(tunnel(), -12);
    const throughSurfaces = balance.surfaces.reduce((sum, surface) => sum + surface.lossW, 0);
    expect(throughSurfaces).toBeCloseTo(balance.lossesW.cover + balance.lossesW.sky, 6);
    for (const surface of balance.surfaces)
      expect(surface.toAirW + surface.toSkyW).toBeCloseTo(surface.lossW, 8);
  });

  it("needs more the warmer it is meant to be, the leakier, and the worse its cover", () => {
    fc.assert(
      fc.property(
        fc.double({ min: -30, max: 5, noNaN: true }),
        fc.double({ min: 8, max: 24, noNaN: true }),
        (tempC, setpointC) => {
          const at = (setC: number) =>
            balanceOf(tunnel({ months: everyMonth({ nightSetpointC: setC }) }), tempC).requiredHeatW;
          expect(at(setpointC + 1)).toBeGreaterThan(at(setpointC));
          const leaky = (changes: number) =>
            balanceOf(tunnel({ leakageAirChangesPerHour: changes }), tempC).requiredHeatW;
          expect(leaky(1.5)).toBeGreaterThan(leaky(0.5));
          const typed = (u: number) =>
            balanceOf(
              tunnel({ covers: { roof: typedCover(u), sideWall: typedCover(u), endWall: typedCover(u) } }),
              tempC,
            ).requiredHeatW;
          expect(typed(4.2)).toBeGreaterThan(typed(4));
        },
      ),
      { numRuns: 25 },
    );
  });

  it("never needs more with the screen shut than open", () => {
    fc.assert(
      fc.property(outdoor, wind, (tempC, windMS) => {
        const input = tunnel({ screen: energyScreen });
        const states = nightBalances(houseModel(input), night(input, Math.min(10, tempC), windMS));
        expect(states.screensShut!.requiredHeatW).toBeLessThanOrEqual(
          states.screensOpen!.requiredHeatW + 1e-6,
        );
      }),
      { numRuns: 40 },
    );
  });

  it("settles where losses equal gains and the heat that is fitted", () => {
    const input = tunnel();
    const model = houseModel(input);
    const short = usualNight(model, night(input, -18, 3, [30_000]));
    expect(short.settlesAtC).toBeLessThan(16);
    const there = { ...night(input, -18, 3, [30_000]) };
    const months = everyMonth({ nightSetpointC: short.settlesAtC });
    const at = usualNight(model, { ...there, use: months[0]! });
    expect(at.requiredHeatW).toBeCloseTo(30_000, 0);
  });

  it("settles warmer with more heat, and never above the set-point", () => {
    const input = nursery();
    const model = houseModel(input);
    let before = -99;
    for (const heatW of [0, 5000, 10_000, 20_000, 80_000]) {
      const settled = usualNight(model, night(input, -20, 3, [heatW])).settlesAtC;
      expect(settled).toBeGreaterThanOrEqual(before);
      expect(settled).toBeLessThanOrEqual(28);
      before = settled;
    }
    expect(before).toBe(28);
  });

  it("is the same for a house twice as long, per metre, ends left out", () => {
    const ends = typedCover(0.01);
    const of = (lengthM: number) =>
      balanceOf(
        tunnel({
          shape: { type: "roundArch", lengthM, widthM: 9, riseM: 3.6, wallHeightM: 0 },
          covers: { roof: stackCover(), sideWall: stackCover(), endWall: ends },
          floorEdgeLossWMK: 0,
        }),
        -12,
      ).requiredHeatW / lengthM;
    expect(of(200) / of(100)).toBeCloseTo(1, 3);
  });

  it("does not change when the house is turned", () => {
    const at = (bearing: number) => balanceOf(tunnel({ ridgeBearingDeg: bearing }), -12).requiredHeatW;
    expect(at(180)).toBeCloseTo(at(0), 6);
    expect(at(77)).toBeCloseTo(at(0), 6);
  });

  it("has no flow at all when nothing is colder than the room", () => {
    const covers = { roof: typedCover(6), sideWall: typedCover(6), endWall: typedCover(6) };
    const balance = balanceOf(tunnel({ covers, months: everyMonth({ nightSetpointC: 5 }) }), 5);
    expect(losses(balance)).toBeCloseTo(0, 9);
    expect(balance.requiredHeatW).toBeCloseTo(0, 9);
  });

  it("counts leaks inside the flow of running fans, and on top only where that is asked for", () => {
    const part = balanceOf(nursery(), -12);
    const added = balanceOf(nursery({ leakageUnderFans: "added" }), -12);
    expect(part.ventilationM3H).toBeCloseTo(1700, 6);
    expect(added.ventilationM3H).toBeCloseTo(1700 + 0.3 * 520, 6);
  });
});
