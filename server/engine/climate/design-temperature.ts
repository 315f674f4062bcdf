import { EngineInputError, requireInRange } from "../errors.ts";
import { normalQuantile, normalShareBelow } from "./normal-distribution.ts";

/** Days in each month of a year without a leap day. */
export const DAYS_IN_MONTH = [31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31] as const;
const DAYS_IN_YEAR = 365;

/**
 * Temperature passed in `percentAbove` % of all hours of the year, the hours of each month taken as normally distributed.
 * Shape: twelve means °C, twelve hourly spreads K (0.2 to 25), percent (80 to 99.99) → °C. Throws EngineInputError outside.
 * Source [ASHRAEF14] for the definition; the sum of twelve normal distributions is solved by bisection.
 */
export function annualPercentileFromMonthsC(
  meanTempsC: readonly number[],
  hourlySpreadsK: readonly number[],
  percentAbove: number,
): number {
  requireTwelve("meanTempsC", meanTempsC);
  requireTwelve("hourlySpreadsK", hourlySpreadsK);
  meanTempsC.forEach((value, index) => {
    requireInRange("meanTempsC", value, -70, 50, "°C", index);
  });
  hourlySpreadsK.forEach((value, index) => {
    requireInRange("hourlySpreadsK", value, 0.2, 25, "K", index);
  });
  requireInRange("percentAbove", percentAbove, 80, 99.99, "%");
  const shareBelow = 1 - percentAbove / 100;
  let low = Math.min(...meanTempsC) - 8 * Math.max(...hourlySpreadsK);
  let high = Math.max(...meanTempsC);
  for (let step = 0; step < 80; step++) {
    const middle = (low + high) / 2;
    if (yearShareBelow(middle, meanTempsC, hourlySpreadsK) < shareBelow) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

function yearShareBelow(
  tempC: number,
  meanTempsC: readonly number[],
  hourlySpreadsK: readonly number[],
): number {
  return DAYS_IN_MONTH.reduce(
    (sum, days, m) =>
      sum +
      (days / DAYS_IN_YEAR) * normalShareBelow((tempC - (meanTempsC[m] ?? 0)) / (hourlySpreadsK[m] ?? 1)),
    0,
  );
}

/**
 * Spreads a yearly design temperature over the months: every month gets the temperature that is as rare within it as the
 * yearly value is within the coldest month, so that the coldest month gets exactly the yearly value.
 * Shape: yearly value °C (below the coldest monthly mean), twelve means °C, twelve spreads K → twelve °C.
 * Throws EngineInputError where the yearly value is not below every monthly mean. Source [ASHRAEF14] for the yearly value.
 */
export function monthlyDesignTempsC(
  yearlyDesignC: number,
  meanTempsC: readonly number[],
  hourlySpreadsK: readonly number[],
): number[] {
  requireTwelve("meanTempsC", meanTempsC);
  requireTwelve("hourlySpreadsK", hourlySpreadsK);
  const coldestMeanC = Math.min(...meanTempsC);
  requireInRange("yearlyDesignC", yearlyDesignC, -90, coldestMeanC - 0.01, "°C");
  const rarity = Math.max(...meanTempsC.map((mean, m) => (yearlyDesignC - mean) / (hourlySpreadsK[m] ?? 1)));
  return meanTempsC.map((mean, m) => mean + rarity * (hourlySpreadsK[m] ?? 0));
}

/**
 * Design temperature of one month on its own: passed in `percentAbove` % of the month's hours, normally distributed.
 * Shape: mean °C, spread K (0 to 25), percent (50 to 99.99) → °C. Throws EngineInputError outside. Source [ASHRAEF14].
 */
export function monthPercentileTempC(meanTempC: number, hourlySpreadK: number, percentAbove: number): number {
  requireInRange("meanTempC", meanTempC, -70, 50, "°C");
  requireInRange("hourlySpreadK", hourlySpreadK, 0, 25, "K");
  requireInRange("percentAbove", percentAbove, 50, 99.99, "%");
  return meanTempC + normalQuantile(1 - percentAbove / 100) * hourlySpreadK;
}

/** Throws EngineInputError unless a list has twelve entries. Shape: name, list → nothing. Source: every monthly method here. */
export function requireTwelve(quantity: string, values: readonly unknown[]): void {
  if (values.length !== 12)
    throw new EngineInputError({
      quantity,
      value: values.length,
      reason: "length",
      note: "Twelve values are needed, January first.",
    });
}
