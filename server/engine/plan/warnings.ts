import type { PlanWarning } from "./plan-types.ts";
import { airWarnings } from "./warnings/air-warnings.ts";
import { climateWarnings } from "./warnings/climate-warnings.ts";
import { heaterWarnings } from "./warnings/heater-warnings.ts";
import { occupancyWarnings } from "./warnings/occupancy-warnings.ts";
import type { WarningContext } from "./warnings/warning-context.ts";

const ORDER = ["block", "caution", "note"];

/**
 * What a careful colleague would point out, the gravest first: slips in the survey, thin data, and what the result means.
 * Shape: context → warnings. Source [CONFUSIONS].
 */
export function planWarnings(context: WarningContext): PlanWarning[] {
  const found = [
    ...airWarnings(context),
    ...heaterWarnings(context),
    ...occupancyWarnings(context),
    ...climateWarnings(context),
  ];
  return found.sort((a, b) => ORDER.indexOf(a.severity) - ORDER.indexOf(b.severity));
}
