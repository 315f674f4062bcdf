import { requireInRange } from "../errors.ts";
import { normalDensity, normalShareBelow } from "./normal-distribution.ts";

/**
 * Mean shortfall of a normally distributed temperature below a base: E[max(0, base − T)].
 * Shape: °C, °C, K → K. Ranges: temperatures −80 to 60 °C, spread 0 to 30 K (0 gives the plain difference).
 * Throws EngineInputError outside. Source [SCHOENAU1990].
 */
export function meanShortfallK(baseTempC: number, meanTempC: number, spreadK: number): number {
  requireInRange("baseTempC", baseTempC, -80, 60, "°C");
  requireInRange("meanTempC", meanTempC, -80, 60, "°C");
  requireInRange("spreadK", spreadK, 0, 30, "K");
  if (spreadK === 0) return Math.max(0, baseTempC - meanTempC);
  const z = (baseTempC - meanTempC) / spreadK;
  return spreadK * Math.max(0, z * normalShareBelow(z) + normalDensity(z));
}

/**
 * Degree-days of a period from its mean and the spread of its days (or hours), by the normal distribution.
 * Shape: °C, °C, K, days 1 to 366 → K·d. Throws EngineInputError outside the ranges of {@link meanShortfallK}. Source [SCHOENAU1990].
 */
export function degreeDaysNormal(
  baseTempC: number,
  meanTempC: number,
  spreadK: number,
  days: number,
): number {
  return requireInRange("days", days, 1, 366, "d") * meanShortfallK(baseTempC, meanTempC, spreadK);
}

/**
 * Degree-days of a month from its mean and the spread of the twelve monthly means alone.
 * Shape: °C, °C, K (0 to 30), days 1 to 31 → K·d. Valid for months whose estimated spread stays above 0.2 K.
 * Throws EngineInputError outside. Source [ERBS1983].
 */
export function degreeDaysErbs(
  baseTempC: number,
  meanTempC: number,
  yearSpreadK: number,
  days: number,
): number {
  requireInRange("baseTempC", baseTempC, -80, 60, "°C");
  requireInRange("meanTempC", meanTempC, -80, 60, "°C");
  requireInRange("yearSpreadK", yearSpreadK, 0, 30, "K");
  requireInRange("days", days, 1, 31, "d");
  const monthSpreadK = requireInRange(
    "monthSpreadK",
    1.45 - 0.029 * meanTempC + 0.0664 * yearSpreadK,
    0.2,
    20,
    "K",
  );
  const h = (baseTempC - meanTempC) / (monthSpreadK * Math.sqrt(days));
  const x = 1.698 * Math.abs(h);
  // ln cosh x written so that it cannot overflow
  const lnCosh = x + Math.log1p(Math.exp(-2 * x)) - Math.LN2;
  return monthSpreadK * days ** 1.5 * Math.max(0, h / 2 + lnCosh / 3.396 + 0.2041);
}

/**
 * Degree-days of a month by Hitchin's formula. `decayPerK` is 0.71 for Britain.
 * Shape: °C, °C, days 1 to 31, 1/K (0.05 to 5) → K·d. Throws EngineInputError outside. Source [HITCHIN1983].
 */
export function degreeDaysHitchin(
  baseTempC: number,
  meanTempC: number,
  days: number,
  decayPerK = 0.71,
): number {
  requireInRange("baseTempC", baseTempC, -80, 60, "°C");
  requireInRange("meanTempC", meanTempC, -80, 60, "°C");
  requireInRange("days", days, 1, 31, "d");
  requireInRange("decayPerK", decayPerK, 0.05, 5, "1/K");
  const differenceK = baseTempC - meanTempC;
  if (Math.abs(differenceK) < 1e-9) return days / decayPerK;
  return (days * differenceK) / -Math.expm1(-decayPerK * differenceK);
}
