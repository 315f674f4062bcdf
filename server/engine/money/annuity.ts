import { requireInRange } from "../errors.ts";

/** Below this a rate counts as zero: the closed forms would lose their digits. */
const ZERO_RATE = 1e-9;

/**
 * Present value of one unit of money a year, first payment after a year, growing by `growth`.
 *
 * Units 1/year, years → years' worth. Valid rates −0.2 to 0.5, 0 to 100 years. Errors EngineInputError. Source [DISCOUNTING].
 */
export function annuityFactor(rate: number, years: number, growth = 0): number {
  requireInRange("rate", rate, -0.2, 0.5, "1/year");
  requireInRange("growth", growth, -0.2, 0.5, "1/year");
  requireInRange("years", years, 0, 100, "years");
  const gap = rate - growth;
  if (Math.abs(gap) < ZERO_RATE) return years / (1 + rate);
  return (1 - ((1 + growth) / (1 + rate)) ** years) / gap;
}

/** Yearly payment that pays off one unit of money. Units 1/year, years → 1/year. Valid 0.1 to 100 years. Errors EngineInputError. Source [DISCOUNTING]. */
export function capitalRecoveryFactor(rate: number, years: number): number {
  requireInRange("years", years, 0.1, 100, "years");
  return 1 / annuityFactor(rate, years);
}
