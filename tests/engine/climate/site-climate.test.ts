import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { degreeDaysNormal } from "../../../server/engine/climate/degree-days.ts";
import { fillMissingMonths } from "../../../server/engine/climate/fill-missing.ts";
import { representativeDays } from "../../../server/engine/climate/representative-days.ts";
import { siteClimate } from "../../../server/engine/climate/site-climate.ts";
import type { StationClimate } from "../../../server/engine/climate/station-climate.ts";

const outsideSun = [2.2, 3.7, 5.9, 8.5, 10.6, 11.5, 11.1, 9.3, 6.9, 4.4, 2.5, 1.8];

const bare: StationClimate = {
  id: "bare",
  name: "Bare plain",
  latitudeDeg: 52,
  longitudeDeg: 10,
  elevationM: 100,
  meanTempC: [0, 1, 4, 9, 14, 17, 19, 18, 14, 9, 4, 1],
  maxTempC: [3, 4, 9, 14, 19, 22, 24, 24, 19, 13, 7, 4],
  minTempC: [-3, -3, 0, 3, 8, 11, 13, 13, 9, 5, 1, -2],
  humidityFrac: null,
  dewPointC: null,
  windMS: null,
  globalKwhM2Day: null,
  hourlySpreadK: null,
  dailySpreadK: null,
  design996C: null,
  design99C: null,
  yearlyColdest: null,
  flags: { humidity: "N", wind: "N", global: "N", spread: "N", design: "N" },
};
const site = { elevationM: 100, frostHollowK: 0 };

describe("months completed where a station reports little", () => {
  it("says of each figure how it came about", () => {
    const filled = fillMissingMonths(bare, outsideSun);
    expect(filled.origins).toEqual({
      humidity: "estimated",
      wind: "typical",
      global: "estimated",
      spread: "typical",
    });
    for (const value of filled.humidityFrac) expect(value).toBeGreaterThan(0.4);
    filled.globalKwhM2Day.forEach((value, m) => {
      expect(value / (outsideSun[m] ?? 1)).toBeGreaterThan(0.2);
      expect(value / (outsideSun[m] ?? 1)).toBeLessThan(0.8);
    });
  });

  it("changes nothing that the station reports", () => {
    const wind = Array(12).fill(7.5);
    expect(fillMissingMonths({ ...bare, windMS: wind }, outsideSun).windMS).toBe(wind);
  });

  it("refuses a mean minimum above the mean maximum", () => {
    expect(() => fillMissingMonths({ ...bare, minTempC: Array(12).fill(30) }, outsideSun)).toThrowError(
      /above the mean maximum/,
    );
  });
});

describe("design temperatures of a site", () => {
  it("uses the station's own value, then the yearly coldest, then the normals", () => {
    const own = siteClimate({ ...bare, design996C: -13 }, site, outsideSun, 99.6, 20);
    expect(Math.min(...own.everydayDesignC)).toBeCloseTo(-13, 10);
    const coldest = { meanC: -14, lowestC: -20, winters: 15 };
    const fromColdest = siteClimate({ ...bare, yearlyColdest: coldest }, site, outsideSun, 99.6, 20);
    expect(fromColdest.everyday.origin).toBe("derived");
    expect(Math.min(...fromColdest.everydayDesignC)).toBeCloseTo(-11.8, 10);
    expect(siteClimate(bare, site, outsideSun, 99.6, 20).everyday.origin).toBe("estimated");
  });

  it("is never warmer once in N years than every day, in any month", () => {
    fc.assert(
      fc.property(
        fc.double({ min: -35, max: -1, noNaN: true }),
        fc.integer({ min: 2, max: 100 }),
        (design, years) => {
          const climate = siteClimate({ ...bare, design996C: design }, site, outsideSun, 99.6, years);
          climate.onceInYearsDesignC.forEach((tempC, m) => {
            expect(tempC).toBeLessThanOrEqual((climate.everydayDesignC[m] ?? 0) + 1e-9);
          });
        },
      ),
    );
  });

  it("makes the design night of a frost hollow colder and leaves the means", () => {
    const hollow = siteClimate(bare, { elevationM: 100, frostHollowK: 4 }, outsideSun, 99.6, 20);
    const plain = siteClimate(bare, site, outsideSun, 99.6, 20);
    expect((plain.everydayDesignC[0] ?? 0) - (hollow.everydayDesignC[0] ?? 0)).toBeCloseTo(4, 10);
    expect(hollow.meanTempC).toEqual(plain.meanTempC);
  });
});

describe("representative days", () => {
  it("keep the month's mean and its range, and come close to its degree-days", () => {
    fc.assert(
      fc.property(
        fc.double({ min: -20, max: 25, noNaN: true }),
        fc.double({ min: 1, max: 8, noNaN: true }),
        fc.double({ min: 2, max: 18, noNaN: true }),
        (meanC, spreadK, rangeK) => {
          const days = representativeDays(meanC, spreadK, rangeK, 5);
          const hours = days.flatMap((day) => day.hourlyTempC);
          expect(hours.reduce((sum, value) => sum + value, 0) / hours.length).toBeCloseTo(meanC, 9);
          const first = days[0]?.hourlyTempC ?? [];
          expect(Math.max(...first) - Math.min(...first)).toBeLessThanOrEqual(rangeK + 1e-9);
          expect(Math.max(...first) - Math.min(...first)).toBeGreaterThan(0.97 * rangeK);
          const byDays =
            (days.reduce((sum, day) => sum + Math.max(0, 15 - day.meanTempC), 0) / days.length) * 30;
          expect(Math.abs(byDays - degreeDaysNormal(15, meanC, spreadK, 30))).toBeLessThan(3 * spreadK);
        },
      ),
    );
  });
});
