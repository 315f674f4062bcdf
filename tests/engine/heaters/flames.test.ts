import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { EngineInputError } from "../../../server/engine/errors.ts";
import { combustionYield, hydrocarbons } from "../../../server/engine/heaters/combustion.ts";
import { airSourceOutputFrac, heatPumpCop, seasonalCop } from "../../../server/engine/heaters/heat-pump.ts";
import { combustionProducts, unventedBurner } from "../../../server/engine/heaters/unvented.ts";
import {
  flameAirByGasM3HKw,
  flameAirByWaterM3HKw,
  unventedHouse,
} from "../../../server/engine/heaters/unvented-house.ts";

const house = {
  airHeatWhM3K: 0.32,
  insideTempC: 30,
  outdoorTempC: -5,
  shellLessGainsW: 6500,
  sensibleFrac: 0.92,
};

describe("combustion", () => {
  it("keeps carbon and hydrogen", () => {
    for (const fuel of Object.values(hydrocarbons)) {
      const yields = combustionYield(fuel);
      const kgPerKwh = 3.6 / fuel.grossMjKg;
      const carbonIn = (fuel.carbonAtoms * 12.011) / (fuel.carbonAtoms * 12.011 + fuel.hydrogenAtoms * 1.008);
      expect((yields.carbonDioxideKgKwh * 12.011) / 44.009).toBeCloseTo(carbonIn * kgPerKwh, 6);
      expect((yields.waterKgKwh * 2.016) / 18.015).toBeCloseTo((1 - carbonIn) * kgPerKwh, 5);
    }
  });

  it("gives the rounded figures used for plans", () => {
    const propane = combustionYield(hydrocarbons.propane);
    expect(propane.waterKgKwh).toBeCloseTo(combustionProducts.lpg.waterKgKwh, 3);
    expect(propane.carbonDioxideM3Kwh).toBeCloseTo(combustionProducts.lpg.carbonDioxideM3Kwh, 3);
    expect(propane.netOverGrossFrac).toBeCloseTo(combustionProducts.lpg.sensibleFrac, 2);
    const methane = combustionYield(hydrocarbons.methane);
    expect(methane.waterKgKwh).toBeCloseTo(combustionProducts["natural-gas"].waterKgKwh, 3);
    expect(methane.carbonDioxideM3Kwh).toBeCloseTo(combustionProducts["natural-gas"].carbonDioxideM3Kwh, 3);
  });
});

describe("a house heated without flues", () => {
  const lines = (gasBase: number, waterBase: number, gasPerKw: number, waterPerKw: number) => [
    { rule: "gas", baseM3H: gasBase, perKwM3H: gasPerKw },
    { rule: "water", baseM3H: waterBase, perKwM3H: waterPerKw },
  ];

  it("closes its balance: the fuel warms shell and all the air any rule asks for", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 20_000, noNaN: true }),
        fc.double({ min: 0, max: 20_000, noNaN: true }),
        fc.double({ min: 0, max: 70, noNaN: true }),
        fc.double({ min: 0, max: 70, noNaN: true }),
        (gas, water, gasKw, waterKw) => {
          const result = unventedHouse({ ...house, lines: lines(gas, water, gasKw, waterKw) });
          expect(result.holds).toBe(true);
          if (!result.holds) return;
          const { burntW, airM3H } = result;
          expect(airM3H).toBeCloseTo(
            Math.max(gas + (gasKw * burntW) / 1000, water + (waterKw * burntW) / 1000),
            6,
          );
          const neededW = airM3H * 0.32 * 35 + 6500;
          expect(0.92 * burntW).toBeGreaterThanOrEqual(neededW - 1e-3);
        },
      ),
    );
  });

  it("is the simple closed form where one rule governs", () => {
    const simple = unventedBurner({
      missingHeatW: 3687 * 0.32 * 35 + 6500,
      sensibleFrac: 0.92,
      airPerKwM3H: 45.88,
      airHeatWhM3K: 0.32,
      insideTempC: 30,
      outdoorTempC: -5,
    });
    const result = unventedHouse({ ...house, lines: lines(3687, 0, 45.88, 0) });
    expect(result.holds && result.burntW).toBeCloseTo(simple.burntW, 4);
  });

  it("says so when a flame asks for more heat than it gives", () => {
    const cold = unventedHouse({ ...house, outdoorTempC: -45, lines: lines(3687, 0, 45.88, 0) });
    expect(cold).toMatchObject({ holds: false, rule: "gas" });
    // The animals cover the first rule's air, but the second one lights a flame whose gas the first cannot carry.
    const tight = unventedHouse({
      ...house,
      outdoorTempC: -45,
      shellLessGainsW: -1000,
      lines: lines(0, 2000, 45.88, 0),
    });
    expect(tight.holds).toBe(false);
  });

  it("burns nothing where the animals cover shell and air", () => {
    expect(
      unventedHouse({ ...house, shellLessGainsW: -90_000, lines: lines(3000, 0, 45.88, 0) }),
    ).toMatchObject({
      holds: true,
      burntW: 0,
      airM3H: 3000,
    });
  });

  it("asks for less air under a looser limit, and none can hold air wetter than outdoors", () => {
    expect(flameAirByGasM3HKw(0.117, 5000, 450)).toBeLessThan(flameAirByGasM3HKw(0.117, 3000, 450));
    expect(flameAirByWaterM3HKw(0.1168, 0.016, 0.002, 0.88)).toBeCloseTo(7.34, 2);
    expect(() => flameAirByWaterM3HKw(0.1168, 0.002, 0.005, 0.88)).toThrow(EngineInputError);
  });
});

describe("heat pumps", () => {
  it("give less for each kWh the higher the lift", () => {
    fc.assert(
      fc.property(
        fc.constantFrom("air" as const, "ground" as const),
        fc.double({ min: 20, max: 59, noNaN: true }),
        (source, lift) => {
          expect(heatPumpCop(source, lift + 1)).toBeLessThan(heatPumpCop(source, lift));
          expect(heatPumpCop("ground", lift)).toBeGreaterThan(heatPumpCop("air", lift));
        },
      ),
    );
    expect(() => heatPumpCop("air", 70)).toThrow(/liftK is 70 K/);
  });

  it("have a season's COP below the mean of COPs", () => {
    const season = seasonalCop([
      { heatKwh: 1000, cop: 2 },
      { heatKwh: 1000, cop: 4 },
    ]);
    expect(season).toBeCloseTo(2.6667, 4);
    expect(() => seasonalCop([])).toThrow(EngineInputError);
  });

  it("lose output in the cold", () => {
    expect(airSourceOutputFrac(10)).toBe(1);
    expect(airSourceOutputFrac(-13)).toBeCloseTo(0.55, 9);
  });
});
