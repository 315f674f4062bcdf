import { EngineInputError, requireInRange } from "../errors.ts";

/** One reading: what was used, over how many days, and its degree-days to the base. */
export interface DegreeDayReading {
  use: number;
  days: number;
  degreeDays: number;
}

export interface DegreeDayFit {
  /** Use a day that does not follow the weather: E = a days + b degree-days. */
  basePerDay: number;
  perDegreeDay: number;
  /** Share of the scatter the weather explains, 0 to 1. */
  r2: number;
  cvRmsePercent: number;
}

/**
 * Least-squares line of use against degree-days.
 *
 * With `by: "reading"` each reading carries the same base, as for calendar months; with "days" the base goes with the days of the
 * reading, as it must for unequal spans. For poultry count batch-days, not calendar days.
 *
 * Units any use, d, K d. Valid 3 or more readings with differing degree-days. Errors EngineInputError. Source [FELS1986].
 */
export function fitDegreeDays(
  readings: readonly DegreeDayReading[],
  by: "reading" | "days" = "days",
): DegreeDayFit {
  requireInRange("readings", readings.length, 3, 10_000);
  let ss = 0;
  let sh = 0;
  let hh = 0;
  let se = 0;
  let he = 0;
  readings.forEach(({ use, days, degreeDays }, index) => {
    requireInRange("use", use, -1e12, 1e12, "", index);
    requireInRange("days", days, 0.01, 400, "d", index);
    requireInRange("degreeDays", degreeDays, 0, 20_000, "K d", index);
    const span = by === "days" ? days : 1;
    ss += span * span;
    sh += span * degreeDays;
    hh += degreeDays * degreeDays;
    se += span * use;
    he += degreeDays * use;
  });
  const determinant = ss * hh - sh * sh;
  if (determinant <= 1e-9 * ss * hh)
    throw new EngineInputError({
      quantity: "degreeDays",
      value: hh,
      reason: "inconsistent",
      unit: "K d",
      note: "All readings have the same weather; no line can be laid through them.",
    });
  const base = (se * hh - he * sh) / determinant;
  const slope = (ss * he - sh * se) / determinant;
  const mean = readings.reduce((sum, { use }) => sum + use, 0) / readings.length;
  let scatter = 0;
  let left = 0;
  for (const { use, days, degreeDays } of readings) {
    scatter += (use - mean) ** 2;
    left += (use - base * (by === "days" ? days : 1) - slope * degreeDays) ** 2;
  }
  return {
    basePerDay: base,
    perDegreeDay: slope,
    r2: scatter === 0 ? 0 : 1 - left / scatter,
    cvRmsePercent: (100 * Math.sqrt(left / Math.max(1, readings.length - 2))) / mean,
  };
}

/**
 * Use of a normal year: base and normal degree-days by a fitted line.
 *
 * Units of the fit. `spans` are days, or readings where the fit was by reading. Errors EngineInputError. Source [FELS1986].
 */
export function normalisedUse(fit: DegreeDayFit, spans: number, normalDegreeDays: number): number {
  requireInRange("spans", spans, 0, 400);
  requireInRange("normalDegreeDays", normalDegreeDays, 0, 20_000, "K d");
  return fit.basePerDay * spans + fit.perDegreeDay * normalDegreeDays;
}

export interface BaseSearch {
  baseTempC: number;
  fit: DegreeDayFit;
}

const BASES_C = { from: -15, to: 25, step: 0.5 } as const;

/**
 * Base temperature that explains bills best, tried in steps of half a kelvin from −15 to 25 °C. Stocked barns have theirs far
 * below room temperature, hens about −5 to −12 °C.
 *
 * Shape: use and days of each reading, degree-days of each reading for any base → base and fit. Errors EngineInputError, also when
 * no base gives weather that differs. Source [FELS1986].
 */
export function bestBaseTemp(
  spans: readonly { use: number; days: number }[],
  degreeDaysOf: (index: number, baseTempC: number) => number,
  by: "reading" | "days" = "days",
): BaseSearch {
  let best: BaseSearch | null = null;
  for (let baseTempC = BASES_C.from; baseTempC <= BASES_C.to; baseTempC += BASES_C.step) {
    const readings = spans.map(({ use, days }, index) => ({
      use,
      days,
      degreeDays: degreeDaysOf(index, baseTempC),
    }));
    const differing = readings.filter(({ degreeDays }) => degreeDays > 0).length;
    if (differing < 3) continue;
    const fit = fitDegreeDays(readings, by);
    if (fit.perDegreeDay > 0 && (best === null || fit.r2 > best.fit.r2)) best = { baseTempC, fit };
  }
  if (best) return best;
  throw new EngineInputError({
    quantity: "readings",
    value: spans.length,
    reason: "inconsistent",
    note: "No base temperature explains these bills.",
  });
}

/** Whether the readings are enough for a yearly figure: ten in a row, or nine across a year with gaps, are the least. Errors none. Source [FELS1986]. */
export function enoughReadings(count: number, inARow: boolean): "good" | "doubtful" | "tooFew" {
  if (count >= 12 && inARow) return "good";
  return count >= (inARow ? 10 : 9) ? "doubtful" : "tooFew";
}

/** Least saving a bill can prove: a tenth, or twice the scatter, whichever is more. Units % → 0 to 1. Errors EngineInputError. Source [IPMVP]. */
export function leastProvableSavingFrac(cvRmsePercent: number): number {
  requireInRange("cvRmsePercent", cvRmsePercent, 0, 1000, "%");
  return Math.max(0.1, (2 * cvRmsePercent) / 100);
}
