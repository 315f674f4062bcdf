import { requireInRange } from "../errors.ts";
import { bisect } from "../numeric/bisect.ts";
import { annuityFactor } from "./annuity.ts";
import { requireSamePrices, type YearlyRate } from "./rates.ts";

/** Money now for money saved every year. */
export interface Investment {
  /** Before any grant. */
  cost: number;
  /** In the prices of the first year; less the measure's own running cost. */
  yearlySaving: number;
  lifeYears: number;
  discount: YearlyRate;
  /** Yearly growth of the saving; none unless said. */
  growth?: YearlyRate;
}

function check(investment: Investment): { rate: number; growth: number } {
  requireInRange("cost", investment.cost, 0, 1e10);
  requireInRange("yearlySaving", investment.yearlySaving, -1e10, 1e10);
  requireInRange("lifeYears", investment.lifeYears, 0.1, 100, "years");
  if (investment.growth) requireSamePrices(investment.discount, investment.growth);
  return { rate: investment.discount.perYear, growth: investment.growth?.perYear ?? 0 };
}

/** Years until the savings of the first year have paid the cost; null when nothing is saved. Errors EngineInputError. Source [DISCOUNTING]. */
export function simplePaybackYears(cost: number, yearlySaving: number): number | null {
  requireInRange("cost", cost, 0, 1e10);
  requireInRange("yearlySaving", yearlySaving, -1e10, 1e10);
  if (cost === 0) return 0;
  return yearlySaving > 0 ? cost / yearlySaving : null;
}

/**
 * Present value of all savings less the cost. Measures are ranked by this.
 *
 * Units money. Errors EngineInputError, also when real and nominal rates meet. Source [DISCOUNTING].
 */
export function netPresentValue(investment: Investment): number {
  const { rate, growth } = check(investment);
  return investment.yearlySaving * annuityFactor(rate, investment.lifeYears, growth) - investment.cost;
}

/**
 * Years until the discounted savings have paid the cost; null when they never do within any life.
 *
 * Units money → years. Errors EngineInputError. Source [DISCOUNTING], closed form.
 */
export function discountedPaybackYears(investment: Investment): number | null {
  const { rate, growth } = check(investment);
  const { cost, yearlySaving } = investment;
  if (cost === 0) return 0;
  if (yearlySaving <= 0) return null;
  const gap = rate - growth;
  if (Math.abs(gap) < 1e-9) return (cost * (1 + rate)) / yearlySaving;
  const left = 1 - (cost * gap) / yearlySaving;
  return left <= 0 ? null : Math.log(left) / Math.log((1 + growth) / (1 + rate));
}

/** Rates between which the internal rate is looked for, 1/year. */
const LOWEST_RATE = -0.2;
const HIGHEST_RATE = 0.5;

/**
 * Rate at which the investment just pays; null when it lies outside −20 to 50 % a year.
 *
 * Units money → 1/year, in the prices of the savings. Errors EngineInputError. Source [DISCOUNTING], by halving.
 */
export function internalRate(investment: Investment): number | null {
  const { growth } = check(investment);
  const value = (rate: number) =>
    investment.yearlySaving * annuityFactor(rate, investment.lifeYears, growth) - investment.cost;
  if (value(LOWEST_RATE) <= 0 || value(HIGHEST_RATE) >= 0) return null;
  return bisect(value, LOWEST_RATE, HIGHEST_RATE, 1e-12);
}

/** The figures an investment is judged by. */
export interface InvestmentFigures {
  cost: number;
  simplePaybackYears: number | null;
  discountedPaybackYears: number | null;
  netPresentValue: number;
  internalRate: number | null;
}

/** All figures of one investment. Errors EngineInputError. Source [DISCOUNTING]. */
export function investmentFigures(investment: Investment): InvestmentFigures {
  return {
    cost: investment.cost,
    simplePaybackYears: simplePaybackYears(investment.cost, investment.yearlySaving),
    discountedPaybackYears: discountedPaybackYears(investment),
    netPresentValue: netPresentValue(investment),
    internalRate: internalRate(investment),
  };
}

/**
 * An investment without a grant, which is the base case, and with it.
 *
 * Units money. Valid grant from 0 up to the cost. Errors EngineInputError. Source [DISCOUNTING].
 */
export function withAndWithoutGrant(
  investment: Investment,
  grant: number,
): { without: InvestmentFigures; with: InvestmentFigures } {
  requireInRange("grant", grant, 0, investment.cost);
  return {
    without: investmentFigures(investment),
    with: investmentFigures({ ...investment, cost: investment.cost - grant }),
  };
}
