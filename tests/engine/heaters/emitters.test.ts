import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { meanShortfallK } from "../../../server/engine/climate/degree-days.ts";
import { EngineInputError } from "../../../server/engine/errors.ts";
import { combustionYield, hydrocarbons } from "../../../server/engine/heaters/combustion.ts";
import { floorHeatWM2, pipeHeatWM, pipeWaterTempC } from "../../../server/engine/heaters/emitters.ts";
import { flameLines } from "../../../server/engine/heaters/flame-lines.ts";
import { seasonLoads } from "../../../server/engine/heaters/season-loads.ts";
import { unventedHouse } from "../../../server/engine/heaters/unvented-house.ts";
import { animalHeat } from "../../../server/engine/livestock/animal-heat.ts";
import { minimumVentilation } from "../../../server/engine/livestock/minimum-ventilation.ts";

describe("pipes and floors", () => {
  it("give more the warmer they are, and come back to their water temperature", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 25, max: 95, noNaN: true }),
        fc.double({ min: 0.03, max: 0.1, noNaN: true }),
        (waterTempC, diameterM) => {
          const heatWM = pipeHeatWM(diameterM, waterTempC, 18);
          expect(pipeHeatWM(diameterM, waterTempC + 1, 18)).toBeGreaterThan(heatWM);
          expect(pipeWaterTempC(heatWM * 250, 250, diameterM, 18)).toBeCloseTo(waterTempC, 4);
        },
      ),
    );
    expect(pipeWaterTempC(1e6, 100, 0.051, 18)).toBeNull();
  });

  it("give 100 W/m² from a floor 9 K over its room", () => {
    expect(floorHeatWM2(29, 20)).toBeCloseTo(100, 0);
    expect(() => floorHeatWM2(15, 20)).toThrow(EngineInputError);
  });
});

describe("loads of a season", () => {
  it("add up to the loss for each kelvin times the mean shortfall", () => {
    fc.assert(
      fc.property(
        fc.double({ min: -15, max: 15, noNaN: true }),
        fc.double({ min: 2, max: 9, noNaN: true }),
        fc.double({ min: -5, max: 18, noNaN: true }),
        (meanC, spreadK, balanceTempC) => {
          const loads = seasonLoads([{ meanC, spreadK, hours: 744, balanceTempC, lossWK: 2000 }]);
          const kwh = loads.reduce((sum, { loadW, hours }) => sum + (loadW * hours) / 1000, 0);
          const exact = 2 * 744 * meanShortfallK(balanceTempC, meanC, spreadK);
          // Forty classes leave less than a hundredth of the spread.
          expect(Math.abs(kwh - exact)).toBeLessThan(2 * 744 * 0.02 * spreadK);
        },
      ),
    );
  });
});

describe("flames in a barn", () => {
  const air = {
    insideTempC: 30,
    humidityLimitFrac: 0.6,
    outdoorTempC: -5,
    outdoorHumidityFrac: 0.85,
    carbonDioxideLimitPpm: 3000,
    outdoorCarbonDioxidePpm: 450,
  };
  const chicks = animalHeat({ animal: "broiler", headCount: 20_000, massKg: 0.2, houseTempC: 30 });
  const least = minimumVentilation({ ...chicks, ...air, headCount: 20_000, perHeadM3H: 0.1 });
  const lines = flameLines(least, combustionYield(hydrocarbons.propane), air);

  it("add to water and gas, not to rates per head", () => {
    const of = (rule: string) => lines.find((line) => line.rule === rule);
    expect(of("carbonDioxide")?.perKwM3H).toBeCloseTo(45.88, 1);
    expect(of("moisture")?.perKwM3H).toBeGreaterThan(5);
    expect(of("perHead")).toMatchObject({ baseM3H: 2000, perKwM3H: 0 });
  });

  it("make the house burn about twice the fuel of vented heat at the same limit", () => {
    const result = unventedHouse({
      lines,
      airHeatWhM3K: 0.3185,
      insideTempC: 30,
      outdoorTempC: -5,
      shellLessGainsW: 700 * 35 - chicks.sensibleW,
      sensibleFrac: 0.921,
    });
    expect(result).toMatchObject({ holds: true, governs: "carbonDioxide" });
    const ventedW = (least.partsM3H.carbonDioxide * 0.3185 * 35 + 700 * 35 - chicks.sensibleW) / 0.8;
    expect(result.holds && result.burntW / ventedW).toBeGreaterThan(1.8);
  });
});
