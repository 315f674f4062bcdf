import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { hourlyActivity, lampActivityRatio } from "../../../server/engine/livestock/activity.ts";
import {
  animalClasses,
  classTrust,
  growingPigClass,
  massRangeKg,
  totalHeatAt20W,
} from "../../../server/engine/livestock/animal-classes.ts";
import { animalHeat } from "../../../server/engine/livestock/animal-heat.ts";
import { heatRules, unitHeatBy } from "../../../server/engine/livestock/heat-rules.ts";
import { unitHeat } from "../../../server/engine/livestock/house-split.ts";

const unit = fc.double({ min: 0, max: 1, noNaN: true });

describe("classes of animals", () => {
  it("give more heat the heavier the animal, over the whole stated range", () => {
    fc.assert(
      fc.property(fc.constantFrom(...animalClasses), unit, unit, (animal, one, other) => {
        const { minKg, maxKg } = massRangeKg(animal);
        const [light, heavy] = [one, other]
          .map((at) => minKg + at * (maxKg - minKg))
          .sort((a, b) => a - b) as [number, number];
        const lightW = totalHeatAt20W(animal, { massKg: light });
        expect(lightW).toBeGreaterThan(0);
        expect(totalHeatAt20W(animal, { massKg: heavy })).toBeGreaterThanOrEqual(lightW - 1e-9);
      }),
    );
  });

  it("do not carry the calves' factor into growing cattle", () => {
    // With 13.3 in the growth term a 300 kg heifer would give about 2.1 kW.
    expect(totalHeatAt20W("heifer", { massKg: 300 })).toBeLessThan(600);
  });

  it("give the share of feed that is not kept as heat", () => {
    // Kept 0.65 of 60 kg; the wrong way round the pig would give 251 W.
    expect(totalHeatAt20W("fatteningPig", { massKg: 60, feedLevel: 3 })).toBeLessThan(200);
  });

  it("refuse gains that would turn a formula over, and eggs in grams", () => {
    expect(() => totalHeatAt20W("calf", { massKg: 60, gainKgDay: 3.2 })).toThrow(/gainKgDay is 3.2/);
    expect(() => totalHeatAt20W("beef", { massKg: 300, gainKgDay: 6 })).toThrow(/gainKgDay is 6/);
    expect(() => totalHeatAt20W("layerCage", { massKg: 1.6, gainKgDay: 50 })).toThrow(
      /between 0 kg\/day and 0.1/,
    );
    expect(() => totalHeatAt20W("beef", { massKg: 300, feedEnergyMjKg: 25 })).toThrow(/feedEnergyMjKg/);
    expect(() => totalHeatAt20W("dairyCow", { massKg: 650, milkKgDay: 9000 })).toThrow(/milkKgDay/);
  });

  it("pass from piglet to fattening pig without a great step", () => {
    expect(growingPigClass(12)).toBe("piglet");
    expect(growingPigClass(20)).toBe("fatteningPig");
    const before = totalHeatAt20W("piglet", { massKg: 20, feedLevel: 3 });
    const after = totalHeatAt20W("fatteningPig", { massKg: 20, feedLevel: 3 });
    expect(Math.abs(after / before - 1)).toBeLessThan(0.15);
  });

  it("say which formulas are borrowed", () => {
    expect(classTrust("broiler")).toBe("published");
    expect(classTrust("horse")).toBe("typical");
    expect(classTrust("duck")).toBe("assumed");
  });

  it("count milk, pregnancy and growth as more heat", () => {
    const cow = { massKg: 650, milkKgDay: 20, pregnantDays: 100 };
    expect(
      totalHeatAt20W("dairyCow", { ...cow, milkKgDay: 30 }) - totalHeatAt20W("dairyCow", cow),
    ).toBeCloseTo(220, 6);
    expect(totalHeatAt20W("dairyCow", { ...cow, pregnantDays: 200 })).toBeGreaterThan(
      totalHeatAt20W("dairyCow", cow),
    );
    expect(totalHeatAt20W("lamb", { massKg: 20, gainKgDay: 0.3 })).toBeGreaterThan(
      totalHeatAt20W("lamb", { massKg: 20, gainKgDay: 0.2 }),
    );
  });
});

describe("rules for sharing heat between air and water", () => {
  it("all close: sensible and latent make the total", () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...heatRules),
        fc.constantFrom("cattle" as const, "pigs" as const, "broilers" as const, "layers" as const),
        fc.double({ min: -40, max: 45, noNaN: true }),
        (rule, group, tempC) => {
          const heat = unitHeatBy(rule, group, tempC);
          expect(heat.sensibleW + heat.latentW).toBeCloseTo(heat.totalW, 9);
          expect(Math.min(heat.sensibleW, heat.latentW)).toBeGreaterThanOrEqual(0);
          expect(heat.totalW).toBeGreaterThanOrEqual(500);
        },
      ),
    );
  });

  it("keep the square of the broilers' line outside the bracket", () => {
    // Inside the bracket 20 °C would give 554 W.
    expect(unitHeat("broilers", 20).sensibleW).toBeCloseTo(518.8, 1);
  });

  it("count less water for the animals alone than for the house", () => {
    for (const group of ["cattle", "pigs", "broilers", "layers"] as const)
      expect(unitHeatBy("animal2002", group, 15).latentW).toBeLessThan(unitHeat(group, 15).latentW);
  });

  it("scale with the breed", () => {
    const herd = { animal: "fatteningPig", headCount: 100, massKg: 60, houseTempC: 18 } as const;
    expect(animalHeat({ ...herd, geneticsFactor: 1.16 }).moistureKgH).toBeCloseTo(
      1.16 * animalHeat(herd).moistureKgH,
      9,
    );
    expect(() => animalHeat({ ...herd, geneticsFactor: 16 })).toThrow(/geneticsFactor/);
  });
});

describe("heat through the day", () => {
  it("has a mean of one for every class", () => {
    for (const animal of animalClasses) {
      const hours = hourlyActivity(animal);
      expect(hours).toHaveLength(24);
      expect(hours.reduce((sum, value) => sum + value / 24, 0)).toBeCloseTo(1, 9);
      expect(Math.min(...hours)).toBeGreaterThan(0);
    }
  });

  it("has a mean of one under lamps, whenever they go on", () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 23 }), fc.integer({ min: 1, max: 24 }), (on, light) => {
        const mean =
          Array.from({ length: 24 }, (_, hour) => lampActivityRatio(hour, on, light)).reduce(
            (sum, value) => sum + value,
            0,
          ) / 24;
        expect(mean).toBeCloseTo(1, 9);
      }),
    );
    expect(lampActivityRatio(12, 5, 16) / lampActivityRatio(1, 5, 16)).toBeCloseTo(8.5 / 5.1, 9);
  });
});
