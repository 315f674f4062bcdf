import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  bestBaseTemp,
  enoughReadings,
  fitDegreeDays,
  leastProvableSavingFrac,
} from "../../../server/engine/bills/degree-day-fit.ts";
import { fitFigures, fitsBills, readingsOff } from "../../../server/engine/bills/fit-figures.ts";
import { likelyCauses, unexplained } from "../../../server/engine/bills/likely-causes.ts";
import { EngineInputError } from "../../../server/engine/errors.ts";
import type { FuelProperties } from "../../../server/engine/fuel/fuel-properties.ts";

const propane: FuelProperties = {
  id: "lpg",
  netOverGrossFrac: 0.921,
  kwhGrossPerKg: 13.98,
  kgPerL: 0.504,
  carbonDioxideKgPerKwh: 0.2145,
  biogenic: false,
};
const gas: FuelProperties = {
  id: "natural-gas",
  netOverGrossFrac: 0.901,
  kwhGrossPerM3: 10.62,
  carbonDioxideKgPerKwh: 0.18105,
  biogenic: false,
};
const use = fc.array(fc.double({ min: 1, max: 1000, noNaN: true }), { minLength: 12, maxLength: 12 });

describe("how well a model follows bills", () => {
  it("is perfect against itself, and larger with a parameter taken off", () => {
    fc.assert(
      fc.property(use, use, (billed, modelled) => {
        const own = fitFigures(billed, billed);
        expect(own.nmbePercent).toBe(0);
        expect(own.cvRmsePercent).toBe(0);
        const one = fitFigures(billed, modelled);
        const none = fitFigures(billed, modelled, 0);
        expect(Math.abs(one.nmbePercent)).toBeGreaterThanOrEqual(Math.abs(none.nmbePercent));
        expect(one.cvRmsePercent).toBeGreaterThanOrEqual(none.cvRmsePercent);
      }),
    );
  });

  it("is positive where the model is low, and keeps each month", () => {
    const figures = fitFigures([100, 100], [80, 90]);
    expect(figures.nmbePercent).toBeGreaterThan(0);
    expect(figures.residuals).toEqual([20, 10]);
    expect(fitsBills(figures)).toBe(false);
    expect(() => fitFigures([100, 100], [80])).toThrow(/There are 2 bills/);
  });
});

describe("single months", () => {
  it("are named where they are far off though the year fits", () => {
    const billed = [820, 700, 560, 330, 120, 40, 1, 25, 110, 310, 540, 760];
    const modelled = [820, 700, 560, 330, 200, 40, 9, 25, 110, 310, 540, 760];
    const figures = fitFigures(billed, modelled);
    expect(fitsBills(figures)).toBe(true);
    expect(readingsOff(figures, billed)).toEqual([{ index: 4, offFrac: expect.closeTo(-2 / 3, 9) }]);
  });
});

describe("use against degree-days", () => {
  it("finds the line bills were made with", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 20, noNaN: true }),
        fc.double({ min: 0.1, max: 10, noNaN: true }),
        (base, slope) => {
          const readings = [31, 28, 31, 30, 45, 20].map((days, index) => ({
            days,
            degreeDays: 60 * index + 10,
            use: base * days + slope * (60 * index + 10),
          }));
          const fit = fitDegreeDays(readings);
          expect(fit.basePerDay).toBeCloseTo(base, 6);
          expect(fit.perDegreeDay).toBeCloseTo(slope, 6);
          expect(fit.r2).toBeCloseTo(1, 9);
        },
      ),
    );
  });

  it("finds the base temperature of a barn that heats only in hard frost", () => {
    const meansC = [-12, -9, -3, 4, 10, 15, 17, 16, 11, 5, -2, -8];
    // Swing of ±8 K around each mean in 16 equal classes, so that degree-days bend as real ones do.
    const degreeDays = (index: number, base: number) =>
      Array.from({ length: 16 }, (_, step) =>
        Math.max(0, base - ((meansC[index] ?? 0) - 8 + step + 0.5)),
      ).reduce((sum, value) => sum + (value * 30) / 16, 0);
    const spans = meansC.map((_, index) => ({ days: 30, use: 60 + 3 * degreeDays(index, -6) }));
    const { baseTempC, fit } = bestBaseTemp(spans, degreeDays);
    expect(baseTempC).toBe(-6);
    expect(fit.perDegreeDay).toBeCloseTo(3, 6);
    expect(fit.basePerDay).toBeCloseTo(2, 6);
  });

  it("needs weather that differs and enough readings", () => {
    const same = { use: 10, days: 30, degreeDays: 100 };
    expect(() => fitDegreeDays([same, same, same])).toThrow(EngineInputError);
    expect(enoughReadings(12, true)).toBe("good");
    expect(enoughReadings(10, true)).toBe("doubtful");
    expect(enoughReadings(9, false)).toBe("doubtful");
    expect(enoughReadings(9, true)).toBe("tooFew");
    expect(leastProvableSavingFrac(3)).toBe(0.1);
    expect(leastProvableSavingFrac(12)).toBeCloseTo(0.24, 9);
  });
});

describe("why bills and model differ", () => {
  const first = (
    billedKwhGross: number,
    modelledKwhGross: number,
    fuel: FuelProperties,
    unit: "kg" | "ccf" | "galUS",
  ) => likelyCauses({ billedKwhGross, modelledKwhGross, fuel, unit })[0];

  it("names litres headed as kilograms", () => {
    expect(first(119.6, 62.7, propane, "kg")).toMatchObject({ kind: "unitMistaken", reallyUnit: "L" });
  });

  it("names thousands of cubic feet headed as hundreds, and lost decimals", () => {
    expect(first(1000, 10_000, gas, "ccf")).toMatchObject({ expectedRatio: expect.closeTo(0.1, 9) });
    const causes = likelyCauses({ billedKwhGross: 10, modelledKwhGross: 1, fuel: gas, unit: "m3" });
    expect(causes.map(({ kind }) => kind)).toContain("factorOfTen");
  });

  it("names imperial gallons", () => {
    expect(first(100, 120, propane, "galUS")).toMatchObject({ kind: "unitMistaken", reallyUnit: "galUK" });
  });

  it("asks for other users and fans before anything else where no unit fits", () => {
    const kinds = likelyCauses({ billedKwhGross: 145, modelledKwhGross: 100, fuel: propane, unit: "L" }).map(
      ({ kind }) => kind,
    );
    expect(kinds).toEqual(["sharedMeter", "fansTooFast"]);
    const measured = likelyCauses({
      billedKwhGross: 145,
      modelledKwhGross: 100,
      fuel: propane,
      unit: "L",
      flowRatio: 2.9,
    });
    expect(measured[0]?.kind).toBe("fansTooFast");
  });

  it("is silent where they agree, and tells the heating value where that is all", () => {
    expect(likelyCauses({ billedKwhGross: 103, modelledKwhGross: 100, fuel: gas, unit: "kWh" })).toEqual([]);
    expect(likelyCauses({ billedKwhGross: 92, modelledKwhGross: 100, fuel: gas, unit: "kWh" })[0]?.kind).toBe(
      "heatingValue",
    );
  });

  it("leaves a gap on a shared tank to stand by itself", () => {
    const { gapKwh, gapFrac } = unexplained(158_700, [
      { name: "Tunnel", kwhGross: 41_000 },
      { name: "Broilers", kwhGross: 85_000 },
      { name: "Farrowing", kwhGross: 10_000 },
    ]);
    expect(gapKwh).toBeCloseTo(22_700, 6);
    expect(gapFrac).toBeCloseTo(0.143, 3);
  });
});
