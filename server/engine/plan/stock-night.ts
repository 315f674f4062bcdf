import { activityPattern } from "../livestock/activity.ts";
import type { AnimalClass } from "../livestock/animal-classes.ts";
import { activityRatio } from "../livestock/house-split.ts";

/**
 * Heat of animals at the low of their night, as a share of their daily mean: what a cold night can count on.
 * Shape: class → share 0 to 1. Source [ACTIVITY].
 */
export function nightLowRatio(animal: AnimalClass): number {
  const { amplitude, lowHour } = activityPattern(animal);
  return activityRatio(lowHour, amplitude, lowHour);
}
