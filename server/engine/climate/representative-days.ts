import { requireInRange } from "../errors.ts";
import { normalDensity, normalQuantile } from "./normal-distribution.ts";

/** One typical day: it stands for `weight` of the month's days. */
export interface RepresentativeDay {
  weight: number;
  meanTempC: number;
  /** Mean temperature of each hour in solar time, °C, 24 values, the first from midnight to one. */
  hourlyTempC: number[];
}

/** Hour of the lowest and of the highest temperature in solar time. Source [SPREADPRACTICE]: about sunrise and mid-afternoon. */
const COLDEST_HOUR = 6;
const WARMEST_HOUR = 15;

/**
 * One z for each of `count` equally likely classes of the standard normal distribution, coldest first: the class means,
 * widened so that mean 0 and variance 1 are kept exactly. Shape: 1 to 50 → list (0 for one class).
 * Throws EngineInputError outside. Source [SCHOENAU1990] for the normal distribution of days.
 */
export function equalShareClasses(count: number): number[] {
  requireInRange("count", count, 1, 50);
  const edgeDensity = (k: number) => (k <= 0 || k >= count ? 0 : normalDensity(normalQuantile(k / count)));
  const means = Array.from({ length: count }, (_, k) => count * (edgeDensity(k) - edgeDensity(k + 1)));
  const variance = means.reduce((sum, z) => sum + z * z, 0) / count;
  return count === 1 ? [0] : means.map((z) => z / Math.sqrt(variance));
}

/**
 * Shape of the day between its extremes: two half cosines, 0 at the coldest and 1 at the warmest hour, mean-free over 24 hours.
 * Shape: range K (0 to 40) → 24 deviations from the day's mean, K, at the middle of each hour. Throws EngineInputError outside. Source [SPREADPRACTICE].
 */
export function diurnalDeviationsK(rangeK: number): number[] {
  requireInRange("rangeK", rangeK, 0, 40, "K");
  const raw = Array.from({ length: 24 }, (_, hour) => halfCosine(hour + 0.5));
  const mean = raw.reduce((sum, value) => sum + value, 0) / 24;
  return raw.map((value) => (value - mean) * rangeK);
}

function halfCosine(hour: number): number {
  const rising = WARMEST_HOUR - COLDEST_HOUR;
  const sinceColdest = (hour - COLDEST_HOUR + 24) % 24;
  if (sinceColdest <= rising) return (1 - Math.cos((Math.PI * sinceColdest) / rising)) / 2;
  return (1 + Math.cos((Math.PI * (sinceColdest - rising)) / (24 - rising))) / 2;
}

/**
 * Days that together have the month's mean, its spread of daily means and its daily range.
 * Shape: °C, K (0 to 15), K (0 to 40), number of days (1 to 15) → days, coldest first, weights sum to 1; the weighted mean equals the month's mean.
 * Throws EngineInputError outside. Source [SCHOENAU1990], [SPREADPRACTICE].
 */
export function representativeDays(
  meanTempC: number,
  dailySpreadK: number,
  dailyRangeK: number,
  count: number,
): RepresentativeDay[] {
  requireInRange("meanTempC", meanTempC, -70, 50, "°C");
  requireInRange("dailySpreadK", dailySpreadK, 0, 15, "K");
  requireInRange("count", count, 1, 15);
  const swing = diurnalDeviationsK(dailyRangeK);
  return equalShareClasses(count).map((z) => {
    const dayMeanC = meanTempC + z * dailySpreadK;
    return {
      weight: 1 / count,
      meanTempC: dayMeanC,
      hourlyTempC: swing.map((deviation) => dayMeanC + deviation),
    };
  });
}
