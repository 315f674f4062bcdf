import { requireInRange } from "../errors.ts";

const EULER = 0.5772156649015329;
const SQRT_6_OVER_PI = Math.sqrt(6) / Math.PI;

/**
 * How many standard deviations below the mean of the yearly minima the once-in-N-years minimum lies (Gumbel).
 * Shape: years, 1.5 to 1000 → number (negative for very short periods). Throws EngineInputError outside. Source [ASHRAEF14].
 */
export function returnPeriodFactor(years: number): number {
  requireInRange("years", years, 1.5, 1000, "years");
  return -SQRT_6_OVER_PI * (EULER + Math.log(Math.log(years / (years - 1))));
}

/**
 * The temperature that is passed downwards once in `years` years on average.
 * Shape: °C, K (0 to 15), years → °C. Throws EngineInputError outside. Source [ASHRAEF14].
 */
export function onceInYearsTempC(meanYearlyMinC: number, spreadYearlyMinK: number, years: number): number {
  requireInRange("meanYearlyMinC", meanYearlyMinC, -80, 40, "°C");
  requireInRange("spreadYearlyMinK", spreadYearlyMinK, 0, 15, "K");
  return meanYearlyMinC - returnPeriodFactor(years) * spreadYearlyMinK;
}

/** Spread of the yearly coldest temperatures where only a guess is to hand, K. Source [SPREADPRACTICE]: 2 to 4 K is usual. */
export const TYPICAL_YEARLY_MIN_SPREAD_K = 3;

/** A wider spread than this points to a wrong report and not to a climate, K. Source [SPREADPRACTICE]. */
const WIDEST_YEARLY_MIN_SPREAD_K = 5;
/** How many winters weigh as much as the typical value when the spread is estimated. Source [SPREADPRACTICE]. */
const WINTERS_OF_PRIOR = 10;

/**
 * Spread of the yearly minima from their mean, the lowest and the number of winters. The expected lowest of n Gumbel
 * values lies (√6/π)·ln n spreads below the mean; the estimate, at most 5 K, is weighed against the typical 3 K by the winters seen.
 * Shape: °C, °C not above the mean, winters 2 to 200 → K. Throws EngineInputError outside. Source [ASHRAEF14] for the distribution.
 */
export function yearlyMinSpreadK(meanYearlyMinC: number, lowestC: number, winters: number): number {
  requireInRange("winters", winters, 2, 200, "years");
  requireInRange("lowestC", lowestC, -90, meanYearlyMinC, "°C");
  const estimateK = Math.min(
    WIDEST_YEARLY_MIN_SPREAD_K,
    (meanYearlyMinC - lowestC) / (SQRT_6_OVER_PI * Math.log(winters)),
  );
  const weight = winters / (winters + WINTERS_OF_PRIOR);
  return weight * estimateK + (1 - weight) * TYPICAL_YEARLY_MIN_SPREAD_K;
}
