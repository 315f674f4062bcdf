import { annualPercentileFromMonthsC, monthlyDesignTempsC } from "./design-temperature.ts";
import { onceInYearsTempC, TYPICAL_YEARLY_MIN_SPREAD_K, yearlyMinSpreadK } from "./extremes.ts";
import { type FigureOrigin, type FilledMonths, fillMissingMonths } from "./fill-missing.ts";
import { type SiteCorrection, siteCorrection } from "./site-correction.ts";
import type { StationClimate } from "./station-climate.ts";

/** Mean distance from the 99.6 % value down to the mean of the yearly coldest, K. Source [CLIMATETABLES]. */
export const COLDEST_BELOW_996_K = 2.2;
/** How much milder the percentile of one typical year is than that of many years, K. Source [CLIMATETABLES], from memory 1 to 3 K. */
export const TYPICAL_YEAR_MILDNESS_K = 2;

export interface YearlyDesign {
  tempC: number;
  origin: FigureOrigin;
  /** One sentence on how it was found. */
  how: string;
}

export interface SiteClimate {
  correction: SiteCorrection;
  filled: FilledMonths;
  /** Corrected for the site; twelve values each. */
  meanTempC: number[];
  minTempC: number[];
  maxTempC: number[];
  everydayDesignC: number[];
  onceInYearsDesignC: number[];
  everyday: YearlyDesign;
  onceInYears: YearlyDesign;
}

/**
 * The climate of a site from the normals of its station: complete months, the everyday design and the once-in-N-years
 * design of each month, corrected for height and frost hollow.
 * Shape: station, site height m, K of frost hollow, mean daily sun outside the atmosphere by month (kWh/m²), percent 99.6 or
 * 99, return period in years → twelve values each. Throws EngineInputError for impossible figures.
 * Source [ASHRAEF14], [CLIMATETABLES], [LAPSE].
 */
export function siteClimate(
  station: StationClimate,
  site: { elevationM: number; frostHollowK: number },
  outsideSunKwhM2Day: readonly number[],
  everydayPercent: 99.6 | 99,
  returnPeriodYears: number,
): SiteClimate {
  const correction = siteCorrection(site.elevationM, station.elevationM, site.frostHollowK);
  const filled = fillMissingMonths(station, outsideSunKwhM2Day);
  const everyday = yearlyEverydayDesign(station, filled.hourlySpreadK, everydayPercent);
  const onceInYears = yearlyExtremeDesign(station, filled.hourlySpreadK, returnPeriodYears);
  const shifted = (values: readonly number[], byK: number) => values.map((value) => value + byK);
  const design = (yearlyC: number) =>
    shifted(monthlyDesignTempsC(yearlyC, station.meanTempC, filled.hourlySpreadK), correction.designK);
  return {
    correction,
    filled,
    meanTempC: shifted(station.meanTempC, correction.meanK),
    minTempC: shifted(station.minTempC, correction.meanK),
    maxTempC: shifted(station.maxTempC, correction.meanK),
    everydayDesignC: design(everyday.tempC),
    onceInYearsDesignC: design(Math.min(onceInYears.tempC, everyday.tempC)),
    everyday,
    onceInYears,
  };
}

/**
 * Yearly everyday design temperature of a station: as published, else from its yearly coldest values, else from monthly normals.
 * Shape: station, twelve hourly spreads K, percent → °C with how it was found. Source [ASHRAEF14], [CLIMATETABLES].
 */
export function yearlyEverydayDesign(
  station: StationClimate,
  hourlySpreadsK: readonly number[],
  percent: 99.6 | 99,
): YearlyDesign {
  const published = percent === 99.6 ? station.design996C : station.design99C;
  if (published !== null)
    return {
      tempC: published,
      origin: station.flags.design === "E" ? "estimated" : "read",
      how: `The station's own ${percent} % temperature.`,
    };
  const fromNormals = (share: number) =>
    annualPercentileFromMonthsC(station.meanTempC, hourlySpreadsK, share);
  if (station.yearlyColdest !== null) {
    const stepK = percent === 99 ? fromNormals(99) - fromNormals(99.6) : 0;
    const derivedC = station.yearlyColdest.meanC + COLDEST_BELOW_996_K + stepK;
    return {
      // Near the equator the rule would reach into the monthly means; a cold night lies at least one spread below them.
      tempC: Math.min(derivedC, ...station.meanTempC.map((mean, m) => mean - (hourlySpreadsK[m] ?? 0))),
      origin: "derived",
      how: `From the mean of the yearly coldest temperatures of ${station.yearlyColdest.winters} winters.`,
    };
  }
  return {
    tempC: fromNormals(percent),
    origin: "estimated",
    how: "Estimated from monthly means and their spread, because the station has no design temperature.",
  };
}

/**
 * Yearly once-in-N-years temperature of a station: from its yearly coldest values, else estimated from its 99.6 % value.
 * Shape: station, twelve hourly spreads K, years → °C with how it was found. Source [ASHRAEF14], [CLIMATETABLES].
 */
export function yearlyExtremeDesign(
  station: StationClimate,
  hourlySpreadsK: readonly number[],
  years: number,
): YearlyDesign {
  const coldest = station.yearlyColdest;
  if (coldest !== null && coldest.winters >= 5) {
    const spreadK = yearlyMinSpreadK(coldest.meanC, coldest.lowestC, coldest.winters);
    return {
      tempC: onceInYearsTempC(coldest.meanC, spreadK, years),
      origin: "derived",
      how: `From the yearly coldest temperatures of ${coldest.winters} winters: mean ${coldest.meanC.toFixed(1)} °C, spread ${spreadK.toFixed(1)} K.`,
    };
  }
  const everyday = yearlyEverydayDesign(station, hourlySpreadsK, 99.6);
  const mildnessK = station.flags.design === "T" && station.design996C !== null ? TYPICAL_YEAR_MILDNESS_K : 0;
  const meanColdestC = everyday.tempC - mildnessK - COLDEST_BELOW_996_K;
  return {
    tempC: onceInYearsTempC(meanColdestC, TYPICAL_YEARLY_MIN_SPREAD_K, years),
    origin: "estimated",
    how: `Estimated from the 99.6 % temperature with a typical spread of ${TYPICAL_YEARLY_MIN_SPREAD_K} K from winter to winter.`,
  };
}
