import { EngineInputError, requireInRange } from "../errors.ts";

export interface FitFigures {
  /** 100 Σ(bill − model)/((n − p) mean bill); positive where the model is low. */
  nmbePercent: number;
  cvRmsePercent: number;
  readings: number;
  /** Bill less model, one for each reading: a good total can hide a month that is 40 % off. */
  residuals: number[];
}

/** Parameters taken off the number of readings for a simulation. Source [GUIDELINE14]. */
const PARAMETERS_OF_A_SIMULATION = 1;

/**
 * How well a model follows bills.
 *
 * Units any, the same for both → %. Valid 2 or more readings, bills with a mean above 0, 0 to n − 1 parameters; some authors take
 * 0. Errors EngineInputError. Source [GUIDELINE14].
 */
export function fitFigures(
  billed: readonly number[],
  modelled: readonly number[],
  parameters = PARAMETERS_OF_A_SIMULATION,
): FitFigures {
  const readings = billed.length;
  requireInRange("billed", readings, 2, 10_000);
  if (modelled.length !== readings)
    throw new EngineInputError({
      quantity: "modelled",
      value: modelled.length,
      reason: "length",
      note: `There are ${readings} bills.`,
    });
  requireInRange("parameters", parameters, 0, readings - 1);
  const residuals = billed.map(
    (bill, index) =>
      requireInRange("billed", bill, -1e12, 1e12, "", index) -
      requireInRange("modelled", modelled[index] ?? Number.NaN, -1e12, 1e12, "", index),
  );
  const mean = billed.reduce((sum, bill) => sum + bill, 0) / readings;
  requireInRange("meanBilled", mean, 1e-9, 1e12);
  const free = readings - parameters;
  return {
    nmbePercent: (100 * residuals.reduce((sum, residual) => sum + residual, 0)) / (free * mean),
    cvRmsePercent:
      (100 * Math.sqrt(residuals.reduce((sum, residual) => sum + residual ** 2, 0) / free)) / mean,
    readings,
    residuals,
  };
}

/** Limits for a calibrated model, %. Source [GUIDELINE14]. */
export const fitLimits = {
  monthly: { nmbePercent: 5, cvRmsePercent: 15 },
  hourly: { nmbePercent: 10, cvRmsePercent: 30 },
} as const;

/** Whether a model follows its bills well enough. Errors none. Source [GUIDELINE14]. */
export function fitsBills(figures: FitFigures, step: keyof typeof fitLimits = "monthly"): boolean {
  const limits = fitLimits[step];
  return Math.abs(figures.nmbePercent) <= limits.nmbePercent && figures.cvRmsePercent <= limits.cvRmsePercent;
}

/**
 * Readings that are off by more than a share of their bill, worst first. A year can pass while one month is 40 % off.
 *
 * Units of the bills, share 0.05 to 2. Bills below a twentieth of the mean are left out: shares of next to nothing say nothing.
 * Errors EngineInputError. Source [GUIDELINE14].
 */
export function readingsOff(
  figures: FitFigures,
  billed: readonly number[],
  shareFrac = 0.4,
): { index: number; offFrac: number }[] {
  requireInRange("shareFrac", shareFrac, 0.05, 2);
  requireInRange("billed", billed.length, figures.readings, figures.readings);
  const mean = billed.reduce((sum, bill) => sum + bill, 0) / billed.length;
  return figures.residuals
    .map((residual, index) => ({ index, bill: billed[index] ?? 0, residual }))
    .filter(({ bill }) => bill >= mean / 20)
    .map(({ index, bill, residual }) => ({ index, offFrac: residual / bill }))
    .filter(({ offFrac }) => Math.abs(offFrac) > shareFrac)
    .sort((a, b) => Math.abs(b.offFrac) - Math.abs(a.offFrac));
}
