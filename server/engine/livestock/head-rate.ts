import { requireInRange } from "../errors.ts";
import { type SchedulePoint, scheduleValue } from "./schedule.ts";

/** A published way to give winter ventilation for each animal. */
export type HeadRateRule =
  | { kind: "fixed"; perHeadM3H: number }
  /** With the body: m³/h for each kg to the power of 0.75. */
  | { kind: "metabolic"; perKg075M3H: number }
  /** For each kilogram alive. */
  | { kind: "mass"; perKgM3H: number }
  /** Steps by mass, rising: from so many kg on, so much. */
  | { kind: "massSteps"; steps: readonly { fromKg: number; perHeadM3H: number }[] }
  /** By day of the batch. */
  | { kind: "days"; points: readonly SchedulePoint[] };

/**
 * Winter ventilation of one animal by a published rule.
 *
 * Units kg, days → m³/h. Valid mass 0.001 to 2000 kg, rate up to 2000 m³/h; below the lightest step its rate holds. Errors
 * EngineInputError. Source [CHARLES1981] metabolic, [MWPS32] steps.
 */
export function headRateM3H(rule: HeadRateRule, massKg: number, day = 0): number {
  requireInRange("massKg", massKg, 1e-3, 2000, "kg");
  return requireInRange("perHeadM3H", rateOf(rule, massKg, day), 0, 2000, "m³/h");
}

function rateOf(rule: HeadRateRule, massKg: number, day: number): number {
  switch (rule.kind) {
    case "fixed":
      return rule.perHeadM3H;
    case "metabolic":
      return rule.perKg075M3H * massKg ** 0.75;
    case "mass":
      return rule.perKgM3H * massKg;
    case "massSteps": {
      const reached = rule.steps.filter(({ fromKg }) => massKg >= fromKg).at(-1) ?? rule.steps[0];
      return reached?.perHeadM3H ?? 0;
    }
    case "days":
      return scheduleValue(rule.points, day);
  }
}

/** Metabolic winter rates of broilers, m³/h for each kg to the power of 0.75: 1.5e-4 m³/s; breeders' guides about 2.1e-4. Source [CHARLES1981], typical. */
export const broilerMetabolicM3H = { charles: 0.54, breederGuides: 0.76 } as const;
