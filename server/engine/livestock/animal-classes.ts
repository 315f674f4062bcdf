import { requireInRange } from "../errors.ts";
import type { AnimalClass, AnimalState, ClassTrust, SplitGroup } from "./animal-types.ts";
import { classRules } from "./class-rules.ts";

export type { AnimalClass, AnimalState, ClassTrust, SplitGroup } from "./animal-types.ts";
export { animalClasses } from "./animal-types.ts";

/**
 * Total heat of one animal at 20 °C, a mean over the day.
 *
 * Units kg, kg/day, days → W. Valid mass and daily gain by class, milk 0 to 60 kg/day, feed level 1 to 4, feed 6 to 20 MJ/kg. The
 * litter is part of a nursing sow; eggs count as gain, in kg. {@link classTrust} says how far the figure can be trusted.
 * Errors EngineInputError naming the quantity and its range. Source [CIGR2002].
 */
export function totalHeatAt20W(animal: AnimalClass, state: AnimalState): number {
  const rule = classRules[animal];
  requireInRange("massKg", state.massKg, rule.minKg, rule.maxKg, "kg");
  if (state.gainKgDay !== undefined)
    requireInRange("gainKgDay", state.gainKgDay, 0, rule.maxGainKgDay, "kg/day");
  if (state.milkKgDay !== undefined) requireInRange("milkKgDay", state.milkKgDay, 0, 60, "kg/day");
  if (state.feedLevel !== undefined) requireInRange("feedLevel", state.feedLevel, 1, 4);
  if (state.pregnantDays !== undefined) requireInRange("pregnantDays", state.pregnantDays, 0, 400);
  if (state.feedEnergyMjKg !== undefined)
    requireInRange("feedEnergyMjKg", state.feedEnergyMjKg, 6, 20, "MJ/kg");
  return rule.totalW(state);
}

/** Range of masses a class is stated for, kg. */
export function massRangeKg(animal: AnimalClass): { minKg: number; maxKg: number } {
  const { minKg, maxKg } = classRules[animal];
  return { minKg, maxKg };
}

/** Which house-level split of heat a class follows; horses, sheep, goats and rabbits follow cattle. Errors none. Source [CIGR2002]. */
export function splitGroup(animal: AnimalClass): SplitGroup {
  return classRules[animal].split;
}

/** Whether the formula of a class was published for it, is typical, or is borrowed. Errors none. Source [CIGR2002]. */
export function classTrust(animal: AnimalClass): ClassTrust {
  return classRules[animal].trust;
}

/** Mass from which a growing pig follows the formula of fattening pigs, kg: that of piglets is stated for 2 to 20 kg. */
const FATTENING_FROM_KG = 20;

/** Class of a growing pig by its mass, for houses that keep pigs from weaning to the end. Valid 1 to 180 kg. Errors EngineInputError. Source [CIGR2002]. */
export function growingPigClass(massKg: number): "piglet" | "fatteningPig" {
  requireInRange("massKg", massKg, 1, 180, "kg");
  return massKg < FATTENING_FROM_KG ? "piglet" : "fatteningPig";
}
