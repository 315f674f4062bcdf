import type { HouseModel } from "../house-model.ts";
import type { PlanClimate } from "../plan-climate.ts";
import type { MonthResult, PlanSizing, PlanWarning } from "../plan-types.ts";
import type { HeaterUnit } from "../sizing-types.ts";

/** What warnings are found from. */
export interface WarningContext {
  model: HouseModel;
  climate: PlanClimate;
  months: readonly MonthResult[];
  sizing: PlanSizing;
  units: readonly HeaterUnit[];
}

/** Puts a warning together. */
export function warning(
  severity: PlanWarning["severity"],
  code: string,
  message: string,
  action: string,
  field?: string,
): PlanWarning {
  return field === undefined
    ? { code, severity, message, action }
    : { code, severity, message, action, field };
}
