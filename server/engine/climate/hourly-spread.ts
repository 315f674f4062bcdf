import { requireInRange } from "../errors.ts";

/** Variance of a sine over its peak-to-peak range, as a divisor of the range: 2·√2. */
const SINE_RANGE_PER_SPREAD = 2 * Math.SQRT2;

/**
 * Standard deviation of hourly temperatures in a month from the daily range and the spread of daily means.
 * Shape: K (0 to 40), K (0 to 15) → K. Throws EngineInputError outside. Source [SPREADPRACTICE]: a sine plus day-to-day change.
 */
export function hourlySpreadK(dailyRangeK: number, dailySpreadK: number): number {
  requireInRange("dailyRangeK", dailyRangeK, 0, 40, "K");
  requireInRange("dailySpreadK", dailySpreadK, 0, 15, "K");
  return Math.hypot(dailyRangeK / SINE_RANGE_PER_SPREAD, dailySpreadK);
}

/**
 * Spread of daily means where a station reports none: 2.2 K in the mildest climate, rising with the swing between the
 * warmest and the coldest month (maritime about 3, continental about 6 in winter), smaller in the warm half of the year.
 * Shape: K (0 to 80), 0 (coldest month) to 1 (warmest) → K. Throws EngineInputError outside. Source [SPREADPRACTICE].
 */
export function typicalDailySpreadK(yearlySwingK: number, warmthFrac: number): number {
  requireInRange("yearlySwingK", yearlySwingK, 0, 80, "K");
  requireInRange("warmthFrac", warmthFrac, 0, 1);
  const winterK = 2.2 + 0.1 * yearlySwingK;
  return winterK * (1 - 0.4 * warmthFrac);
}
