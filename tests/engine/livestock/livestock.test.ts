import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { EngineInputError } from "../../../server/engine/errors.ts";
import { animalClasses, massRangeKg, splitGroup } from "../../../server/engine/livestock/animal-classes.ts";
import { animalHeat } from "../../../server/engine/livestock/animal-heat.ts";
import { activityRatio, unitHeat } from "../../../server/engine/livestock/house-split.ts";
import {
  heatRecoveryFrac,
  minimumVentilation,
} from "../../../server/engine/livestock/minimum-ventilation.ts";

const animal = fc.constantFrom(...animalClasses);
const share = fc.double({ min: 0, max: 1, noNaN: true });
const stock = fc
  .tuple(animal, share, fc.integer({ min: 1, max: 50_000 }), fc.double({ min: -10, max: 38, noNaN: true }))
  .map(([kind, at, headCount, houseTempC]) => {
    const { minKg, maxKg } = massRangeKg(kind);
    return { animal: kind, massKg: minKg + at * (maxKg - minKg), headCount, houseTempC };
  });

describe("heat of animals", () => {
  it("is sensible and latent heat, both not negative", () => {
    fc.assert(
      fc.property(stock, (input) => {
        const heat = animalHeat(input);
        expect(heat.sensibleW + heat.latentW).toBeCloseTo(heat.totalW, 6);
        expect(heat.sensibleW).toBeGreaterThanOrEqual(0);
        expect(heat.latentW).toBeGreaterThanOrEqual(0);
        expect(heat.moistureKgH).toBeGreaterThanOrEqual(0);
      }),
    );
  });

  it("grows with the herd and with the animal", () => {
    fc.assert(
      fc.property(stock, (input) => {
        const more = animalHeat({ ...input, headCount: input.headCount * 2 });
        expect(more.totalW).toBeCloseTo(2 * animalHeat(input).totalW, 6);
      }),
    );
  });

  it("turns from air to water as the house warms", () => {
    for (const group of new Set(animalClasses.map(splitGroup))) {
      let before = 1;
      for (let tempC = 0; tempC <= 35; tempC += 1) {
        const { sensibleW, totalW } = unitHeat(group, tempC);
        expect(sensibleW / totalW).toBeLessThanOrEqual(before + 1e-9);
        before = sensibleW / totalW;
      }
    }
  });

  it("has a day whose mean is one", () => {
    fc.assert(
      fc.property(share, fc.double({ min: 0, max: 24, noNaN: true }), (amplitude, quiet) => {
        const mean = Array.from({ length: 24 }, (_, hour) => activityRatio(hour, amplitude, quiet)).reduce(
          (sum, value) => sum + value / 24,
          0,
        );
        expect(mean).toBeCloseTo(1, 9);
      }),
    );
  });

  it("names a mass no such animal has", () => {
    expect(() => animalHeat({ animal: "broiler", headCount: 10, massKg: 60, houseTempC: 20 })).toThrow(
      EngineInputError,
    );
    expect(() => animalHeat({ animal: "broiler", headCount: 10, massKg: 60, houseTempC: 20 })).toThrow(
      /massKg is 60 kg; it must lie between 0.03 kg and 8 kg/,
    );
  });
});

describe("least ventilation", () => {
  const air = {
    insideTempC: 20,
    humidityLimitFrac: 0.7,
    outdoorTempC: -5,
    outdoorHumidityFrac: 0.8,
    headCount: 100,
    perHeadM3H: 5,
  };

  it("never falls with more animals or wetter outdoor air", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 200, noNaN: true }),
        fc.double({ min: 0, max: 50, noNaN: true }),
        fc.double({ min: 0.3, max: 0.9, noNaN: true }),
        (water, more, wet) => {
          const one = minimumVentilation({ ...air, moistureKgH: water, carbonDioxideM3H: 10 });
          const two = minimumVentilation({ ...air, moistureKgH: water + more, carbonDioxideM3H: 10 });
          expect(two.flowM3H).toBeGreaterThanOrEqual(one.flowM3H - 1e-9);
          const dry = minimumVentilation({
            ...air,
            moistureKgH: water,
            carbonDioxideM3H: 0,
            outdoorHumidityFrac: wet,
          });
          const wetter = minimumVentilation({
            ...air,
            moistureKgH: water,
            carbonDioxideM3H: 0,
            outdoorHumidityFrac: wet + 0.1,
          });
          expect(wetter.flowM3H).toBeGreaterThanOrEqual(dry.flowM3H - 1e-9);
        },
      ),
    );
  });

  it("says which rule governs", () => {
    expect(minimumVentilation({ ...air, moistureKgH: 0, carbonDioxideM3H: 0 }).governs).toBe("perHead");
    expect(minimumVentilation({ ...air, moistureKgH: 90, carbonDioxideM3H: 1 }).governs).toBe("moisture");
    expect(minimumVentilation({ ...air, moistureKgH: 1, carbonDioxideM3H: 90 }).governs).toBe(
      "carbonDioxide",
    );
    expect(minimumVentilation({ ...air, moistureKgH: 1, carbonDioxideM3H: 1, legalM3H: 1e5 }).governs).toBe(
      "legal",
    );
  });

  it("holds the exchanger where its outlet would freeze", () => {
    expect(heatRecoveryFrac(0.7, 20, -8)).toBeCloseTo(0.7, 9);
    expect(heatRecoveryFrac(0.7, 20, -20)).toBeCloseTo(0.5, 9);
    expect(heatRecoveryFrac(0.7, 20, 25)).toBe(0);
  });
});
