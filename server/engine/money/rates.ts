import { EngineInputError, requireInRange } from "../errors.ts";

/** Constant prices, or prices of their day with inflation in them. */
export type PriceKind = "real" | "nominal";

/** A share per year and the prices it belongs to. */
export interface YearlyRate {
  perYear: number;
  prices: PriceKind;
}

/** Rates outside this are typing slips: 6 for 6 %. */
const LOWEST = -0.2;
const HIGHEST = 0.5;

/** A rate in constant prices. Units 1/year. Valid −0.2 to 0.5. Errors EngineInputError. Source [DISCOUNTING]. */
export function realRate(perYear: number): YearlyRate {
  return { perYear: requireInRange("perYear", perYear, LOWEST, HIGHEST, "1/year"), prices: "real" };
}

/** A rate with inflation in it. Units 1/year. Valid −0.2 to 0.5. Errors EngineInputError. Source [DISCOUNTING]. */
export function nominalRate(perYear: number): YearlyRate {
  return { perYear: requireInRange("perYear", perYear, LOWEST, HIGHEST, "1/year"), prices: "nominal" };
}

/** The same rate in constant prices. Units 1/year. Errors EngineInputError. Source [DISCOUNTING]: (1 + n)/(1 + i) − 1. */
export function toReal(rate: YearlyRate, inflation: number): YearlyRate {
  requireInRange("inflation", inflation, LOWEST, HIGHEST, "1/year");
  return rate.prices === "real" ? rate : realRate((1 + rate.perYear) / (1 + inflation) - 1);
}

/** Refuses to reckon constant prices with a rate that holds inflation, or the reverse. Errors EngineInputError. Source [DISCOUNTING]. */
export function requireSamePrices(discount: YearlyRate, growth: YearlyRate): void {
  if (discount.prices === growth.prices) return;
  throw new EngineInputError({
    quantity: "growth",
    value: growth.perYear,
    reason: "inconsistent",
    unit: "1/year",
    note: `The discount rate is ${discount.prices}, the price growth ${growth.prices}: bring both to the same prices.`,
  });
}
