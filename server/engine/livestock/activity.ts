import { requireInRange } from "../errors.ts";
import type { AnimalClass } from "./animal-types.ts";
import { activityRatio } from "./house-split.ts";

/** How far the heat of animals swings around its daily mean, and the hour of its low. */
export interface ActivityPattern {
  amplitude: number;
  lowHour: number;
}

const CATTLE = { amplitude: 0.22, lowHour: 2.9 };
const FED_AT_WILL = { amplitude: 0.43, lowHour: 1.7 };
const FED_BY_RATION = { amplitude: 0.5, lowHour: 1.4 };
const BROILERS = { amplitude: 0.08, lowHour: 0 };
const LAYERS = { amplitude: 0.35, lowHour: 0 };

/** Typical values, from memory. Source [ACTIVITY]. */
const patterns: Record<AnimalClass, ActivityPattern> = {
  calf: CATTLE,
  beef: CATTLE,
  heifer: CATTLE,
  dairyCow: CATTLE,
  piglet: FED_AT_WILL,
  fatteningPig: FED_AT_WILL,
  drySow: FED_BY_RATION,
  gilt: FED_BY_RATION,
  boar: FED_BY_RATION,
  nursingSow: FED_AT_WILL,
  broiler: BROILERS,
  turkey: BROILERS,
  duck: BROILERS,
  goose: BROILERS,
  layerCage: LAYERS,
  layerFloor: LAYERS,
  horse: CATTLE,
  ewe: CATTLE,
  lamb: CATTLE,
  goatDry: CATTLE,
  goatMilking: CATTLE,
  rabbit: CATTLE,
};

/** The daily course of a class: swing and quietest hour. Errors none. Source [ACTIVITY], typical. */
export function activityPattern(animal: AnimalClass): ActivityPattern {
  return patterns[animal];
}

/** Heat of a class in each of 24 hours (middle of the hour) relative to its daily mean. Errors none. Source [ACTIVITY]. */
export function hourlyActivity(animal: AnimalClass): number[] {
  const { amplitude, lowHour } = patterns[animal];
  return Array.from({ length: 24 }, (_, hour) => activityRatio(hour + 0.5, amplitude, lowHour));
}

/** Heat of hens in the dark over their heat in the light: 5.1 to 8.5 W/kg. Source [OLIVEIRA2020]. */
const DARK_OVER_LIGHT = 5.1 / 8.5;

/**
 * Heat of hens by their lamps instead of the sine: high in the light, low in the dark, mean over the day 1.
 *
 * Units hours → ratio. Valid hour 0 to 24, light 1 to 24 h, dark share of the light's heat 0.3 to 1. Errors EngineInputError.
 * Source [OLIVEIRA2020].
 */
export function lampActivityRatio(
  hour: number,
  lampsOnHour: number,
  lightHours: number,
  darkOverLight = DARK_OVER_LIGHT,
): number {
  requireInRange("hour", hour, 0, 24, "h");
  requireInRange("lampsOnHour", lampsOnHour, 0, 24, "h");
  requireInRange("lightHours", lightHours, 1, 24, "h");
  requireInRange("darkOverLight", darkOverLight, 0.3, 1);
  const light = 24 / (lightHours + darkOverLight * (24 - lightHours));
  const sinceOn = (hour - lampsOnHour + 24) % 24;
  return sinceOn < lightHours ? light : light * darkOverLight;
}
