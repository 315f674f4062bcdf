import type { AnimalClass } from "../livestock/animal-classes.ts";
import { activityRatio } from "../livestock/house-split.ts";

/** How far the heat of animals swings around its daily mean, and the hour of its low. Source [ACTIVITY], from memory. */
const ACTIVITY: Record<AnimalClass, { amplitude: number; lowHour: number }> = {
  calf: { amplitude: 0.22, lowHour: 2.9 },
  beef: { amplitude: 0.22, lowHour: 2.9 },
  heifer: { amplitude: 0.22, lowHour: 2.9 },
  dairyCow: { amplitude: 0.22, lowHour: 2.9 },
  piglet: { amplitude: 0.43, lowHour: 1.7 },
  fatteningPig: { amplitude: 0.43, lowHour: 1.7 },
  drySow: { amplitude: 0.5, lowHour: 1.4 },
  nursingSow: { amplitude: 0.43, lowHour: 1.7 },
  broiler: { amplitude: 0.08, lowHour: 0 },
  turkey: { amplitude: 0.08, lowHour: 0 },
  layerCage: { amplitude: 0.35, lowHour: 0 },
  layerFloor: { amplitude: 0.35, lowHour: 0 },
  horse: { amplitude: 0.22, lowHour: 2.9 },
  ewe: { amplitude: 0.22, lowHour: 2.9 },
};

/**
 * Heat of animals at the low of their night, as a share of their daily mean: what a cold night can count on.
 * Shape: class → share 0 to 1. Source [ACTIVITY].
 */
export function nightLowRatio(animal: AnimalClass): number {
  const { amplitude, lowHour } = ACTIVITY[animal];
  return activityRatio(lowHour, amplitude, lowHour);
}
