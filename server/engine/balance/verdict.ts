import type { HoldVerdict } from "../plan/plan-types.ts";

/** A house this little below its set-point still counts as holding, K: less than a thermostat's own swing. Source [THERMOSTAT]. */
export const HOLDS_WITHIN_K = 0.1;

/**
 * Whether a house holds, by where it settles. Shape: °C, °C, °C → verdict. Source [THERMOSTAT].
 */
export function holdVerdict(settlesAtC: number, setpointC: number, criticalTempC: number): HoldVerdict {
  if (settlesAtC >= setpointC - HOLDS_WITHIN_K) return "holds";
  return settlesAtC >= criticalTempC ? "belowSetpoint" : "belowCritical";
}
