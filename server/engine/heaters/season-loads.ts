import { equalShareClasses } from "../climate/representative-days.ts";
import { requireInRange } from "../errors.ts";
import type { LoadHours } from "./staging.ts";

/** Hourly temperatures of a month or of any other span. */
export interface LoadSpan {
  meanC: number;
  /** Standard deviation of the hourly temperatures, K. */
  spreadK: number;
  hours: number;
  /** Outdoor temperature from which on no heat is needed, °C. */
  balanceTempC: number;
  /** Loss for each kelvin below it, W/K. */
  lossWK: number;
}

/** Classes each span is cut into: enough for the rare cold hours to show. */
const CLASSES = 40;

/**
 * Loads of a season by their hours, hourly temperatures taken as normally distributed and cut into classes of equal hours.
 *
 * Units °C, K, h, W/K → W, h. Valid −60 to 50 °C, spread 0 to 30 K, up to 9000 h. Errors EngineInputError.
 * Source: normal distribution of hours.
 */
export function seasonLoads(spans: readonly LoadSpan[]): LoadHours[] {
  return spans.flatMap((span, index) => {
    requireInRange("meanC", span.meanC, -60, 50, "°C", index);
    requireInRange("spreadK", span.spreadK, 0, 30, "K", index);
    requireInRange("hours", span.hours, 0, 9000, "h", index);
    requireInRange("balanceTempC", span.balanceTempC, -80, 50, "°C", index);
    requireInRange("lossWK", span.lossWK, 0, 1e8, "W/K", index);
    return equalShareClasses(CLASSES).map((z) => {
      const outdoorC = span.meanC + span.spreadK * z;
      return {
        loadW: span.lossWK * Math.max(0, span.balanceTempC - outdoorC),
        hours: span.hours / CLASSES,
      };
    });
  });
}
