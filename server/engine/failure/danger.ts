import { requireInRange } from "../errors.ts";
import type { SplitGroup } from "../livestock/animal-classes.ts";

/** What kills when the air stands still. */
export interface DangerLimits {
  hotC: number;
  carbonDioxideFrac: number;
}

/**
 * Temperature and carbon dioxide at which animals come to harm in still air. Poultry live 20 to 30 minutes above 36 °C and are
 * harmed above 3 %; pigs were in distress at 35 °C and 4 to 5 %; cattle as pigs for want of figures. Source [STILLAIR].
 */
export const dangerLimits: Readonly<Record<SplitGroup, DangerLimits>> = {
  broilers: { hotC: 36, carbonDioxideFrac: 0.03 },
  layers: { hotC: 36, carbonDioxideFrac: 0.03 },
  pigs: { hotC: 35, carbonDioxideFrac: 0.04 },
  cattle: { hotC: 35, carbonDioxideFrac: 0.04 },
};

/** Usual distances of alarms from the set-point, K: 3 to 4 below, 5 to 6 above. Source [ALARMS]. */
const ALARM_K = { below: 3.5, above: 5.5 } as const;

/** Temperatures at which an alarm should call. Units °C. Valid −20 to 45 °C. Errors EngineInputError. Source [ALARMS]. */
export function alarmTempsC(setpointC: number): { lowC: number; highC: number } {
  requireInRange("setpointC", setpointC, -20, 45, "°C");
  return { lowC: setpointC - ALARM_K.below, highC: setpointC + ALARM_K.above };
}
