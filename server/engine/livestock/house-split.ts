import { requireInRange } from "../errors.ts";
import type { SplitGroup } from "./animal-types.ts";

/** What 1000 W of heat at 20 °C become at another temperature, W. */
export interface UnitHeat {
  totalW: number;
  sensibleW: number;
  latentW: number;
}

interface SplitRule {
  /** Change of the total per kelvin below 20 °C. */
  perKelvin: number;
  share: number;
  loss(tempC: number): number;
}

/** The loss stands outside the bracket of share × total; inside it broilers would come out 7 % too warm. */
const splitRules: Record<SplitGroup, SplitRule> = {
  cattle: { perKelvin: 4, share: 0.71, loss: (t) => 0.408 * t ** 2 },
  pigs: { perKelvin: 12, share: 0.62, loss: (t) => 1.15e-7 * t ** 6 },
  broilers: { perKelvin: 20, share: 0.61, loss: (t) => 0.228 * t ** 2 },
  layers: { perKelvin: 20, share: 0.67, loss: (t) => 9.8e-8 * t ** 6 },
};

/** The correction is straight; it is held outside this band. */
const COLDEST_C = -5;
const WARMEST_C = 38;
const LEAST_TOTAL_W = 600;

/**
 * House-level heat of one heat unit (1000 W at 20 °C): what warms the air and what leaves as water from animals, floor, litter
 * and feed.
 *
 * Units °C → W. Valid −40 to 45 °C; the linear correction is held below −5 and above 38 °C, the total never falls under 600 W and
 * the sensible part never under 0. Errors EngineInputError. Source [CIGR2002].
 */
export function unitHeat(group: SplitGroup, houseTempC: number): UnitHeat {
  requireInRange("houseTempC", houseTempC, -40, 45, "°C");
  const temp = Math.min(WARMEST_C, Math.max(COLDEST_C, houseTempC));
  const rule = splitRules[group];
  const totalW = Math.max(LEAST_TOTAL_W, 1000 + rule.perKelvin * (20 - temp));
  const warmTemp = Math.max(0, temp);
  const sensibleW = Math.min(totalW, Math.max(0, rule.share * totalW - rule.loss(warmTemp)));
  return { totalW, sensibleW, latentW: totalW - sensibleW };
}

/**
 * Heat of animals through the day relative to its mean.
 *
 * Units hours, share → ratio with mean 1. Valid amplitude 0 to 1. Errors EngineInputError. Source [CIGR2002].
 */
export function activityRatio(hour: number, amplitude: number, hourOfMinimum: number): number {
  requireInRange("amplitude", amplitude, 0, 1);
  requireInRange("hour", hour, -24, 48, "h");
  requireInRange("hourOfMinimum", hourOfMinimum, 0, 24, "h");
  return 1 - amplitude * Math.sin(((2 * Math.PI) / 24) * (hour + 6 - hourOfMinimum));
}
