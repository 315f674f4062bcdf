import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  annualPercentileFromMonthsC,
  monthlyDesignTempsC,
  monthPercentileTempC,
} from "../../../server/engine/climate/design-temperature.ts";
import {
  onceInYearsTempC,
  returnPeriodFactor,
  yearlyMinSpreadK,
} from "../../../server/engine/climate/extremes.ts";
import { greatCircleKm, nearestStations } from "../../../server/engine/climate/nearest-station.ts";
import { siteCorrection, windAtEaveMS } from "../../../server/engine/climate/site-correction.ts";
import { EngineInputError } from "../../../server/engine/errors.ts";

const means = [-2, -1, 3, 8, 13, 17, 19, 18, 14, 9, 4, 0];
const spreads = [6, 6, 6, 5, 5, 4, 4, 4, 4, 5, 5, 6];

describe("yearly design temperature over the months", () => {
  it("gives the coldest month exactly the yearly value and the others no colder", () => {
    const monthly = monthlyDesignTempsC(-16, means, spreads);
    expect(Math.min(...monthly)).toBeCloseTo(-16, 10);
    expect(monthly.indexOf(Math.min(...monthly))).toBe(0);
    expect(monthly[6]).toBeGreaterThan(5);
  });

  it("moves with the hemisphere: months shifted by six give values shifted by six", () => {
    const shift = (values: number[]) => [...values.slice(6), ...values.slice(0, 6)];
    const north = monthlyDesignTempsC(-16, means, spreads);
    expect(monthlyDesignTempsC(-16, shift(means), shift(spreads))).toEqual(shift(north));
  });

  it("of twelve equal months is the plain normal quantile", () => {
    const flat = annualPercentileFromMonthsC(Array(12).fill(10), Array(12).fill(5), 99);
    expect(flat).toBeCloseTo(10 - 2.3263479 * 5, 5);
    expect(monthPercentileTempC(10, 5, 99)).toBeCloseTo(flat, 6);
  });

  it("falls as the percentage rises", () => {
    fc.assert(
      fc.property(fc.double({ min: 90, max: 99.5, noNaN: true }), (percent) => {
        expect(annualPercentileFromMonthsC(means, spreads, percent + 0.4)).toBeLessThan(
          annualPercentileFromMonthsC(means, spreads, percent),
        );
      }),
    );
  });

  it("refuses a yearly value warmer than the coldest month, and eleven months", () => {
    expect(() => monthlyDesignTempsC(5, means, spreads)).toThrowError(EngineInputError);
    expect(() => monthlyDesignTempsC(-16, means.slice(1), spreads)).toThrowError(/Twelve/);
  });
});

describe("once in N years", () => {
  it("is colder for longer periods and for wider spread", () => {
    expect(onceInYearsTempC(-15, 3, 50)).toBeLessThan(onceInYearsTempC(-15, 3, 20));
    expect(onceInYearsTempC(-15, 4, 20)).toBeLessThan(onceInYearsTempC(-15, 3, 20));
    expect(returnPeriodFactor(2)).toBeLessThan(0);
  });

  it("leans on the typical spread when few winters were seen", () => {
    expect(Math.abs(yearlyMinSpreadK(-15, -35, 3) - 3)).toBeLessThan(
      Math.abs(yearlyMinSpreadK(-15, -35, 60) - 3) + 3,
    );
    expect(yearlyMinSpreadK(-15, -20, 20)).toBeGreaterThan(1);
    expect(() => yearlyMinSpreadK(-15, -10, 20)).toThrowError(/lowestC/);
  });
});

describe("site and station", () => {
  it("makes a higher site colder and does not credit a lower one on cold nights", () => {
    expect(siteCorrection(500, 300, 0).designK).toBeCloseTo(-1.3, 10);
    expect(siteCorrection(300, 500, 0).meanK).toBeCloseTo(1.3, 10);
    expect(siteCorrection(300, 500, 0).designK).toBeCloseTo(0, 10);
    expect(siteCorrection(300, 300, 3).designK).toBeCloseTo(-3, 10);
    expect(siteCorrection(300, null, 0).reasons[0]).toContain("not known");
  });

  it("slows the wind near the ground and behind shelter", () => {
    expect(windAtEaveMS(5, 10, "open")).toBeCloseTo(5, 10);
    expect(windAtEaveMS(5, 3, "open")).toBeLessThan(5);
    expect(windAtEaveMS(5, 3, "sheltered")).toBeLessThan(windAtEaveMS(5, 3, "normal"));
  });

  it("measures a quarter and half of the earth, and one degree of latitude", () => {
    expect(greatCircleKm(0, 0, 0, 180)).toBeCloseTo(Math.PI * 6371.0088, 4);
    expect(greatCircleKm(90, 0, 0, 17)).toBeCloseTo((Math.PI / 2) * 6371.0088, 4);
    expect(greatCircleKm(10, 5, 11, 5)).toBeCloseTo(111.195, 2);
    expect(greatCircleKm(0, 179.9, 0, -179.9)).toBeCloseTo(22.239, 2);
  });

  it("ranks a near station at the same height before a nearer one far above", () => {
    const stations = [
      { id: "hill", latitudeDeg: 50.05, longitudeDeg: 10, elevationM: 900 },
      { id: "plain", latitudeDeg: 50.3, longitudeDeg: 10, elevationM: 210 },
    ];
    expect(nearestStations(50, 10, 200, stations)[0]?.station.id).toBe("plain");
    expect(nearestStations(50, 10, null, stations)[0]?.station.id).toBe("hill");
  });
});
