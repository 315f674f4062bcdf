import { requireInRange } from "../errors.ts";
import { annuityFactor } from "./annuity.ts";
import { requireSamePrices, type YearlyRate } from "./rates.ts";

export interface LifeCycle {
  cost: number;
  energyPerYear: number;
  servicePerYear: number;
  years: number;
  discount: YearlyRate;
  energyGrowth?: YearlyRate;
  /** Parts bought again within the time, each at the end of its year. */
  replacements?: readonly { year: number; cost: number }[];
  /** Worth of what is left at the end. */
  residualValue?: number;
}

/**
 * Present cost of owning and running something: buying, fuel, service, replacing, less what is left.
 *
 * Units money, years. Valid 1 to 100 years, replacements within them. Errors EngineInputError, also when real and nominal rates
 * meet. Source [DISCOUNTING].
 */
export function lifeCycleCost(cycle: LifeCycle): number {
  requireInRange("cost", cycle.cost, 0, 1e10);
  requireInRange("energyPerYear", cycle.energyPerYear, -1e10, 1e10);
  requireInRange("servicePerYear", cycle.servicePerYear, 0, 1e10);
  requireInRange("years", cycle.years, 1, 100, "years");
  if (cycle.energyGrowth) requireSamePrices(cycle.discount, cycle.energyGrowth);
  const rate = cycle.discount.perYear;
  const replaced = (cycle.replacements ?? []).reduce((sum, { year, cost }, index) => {
    requireInRange("year", year, 0, cycle.years, "years", index);
    requireInRange("cost", cost, 0, 1e10, "", index);
    return sum + cost / (1 + rate) ** year;
  }, 0);
  const residual = requireInRange("residualValue", cycle.residualValue ?? 0, 0, 1e10);
  return (
    cycle.cost +
    cycle.energyPerYear * annuityFactor(rate, cycle.years, cycle.energyGrowth?.perYear ?? 0) +
    cycle.servicePerYear * annuityFactor(rate, cycle.years) +
    replaced -
    residual / (1 + rate) ** cycle.years
  );
}
