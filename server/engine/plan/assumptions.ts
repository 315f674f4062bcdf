import { coverAssumptions, houseAssumptions } from "./assumptions/house-assumptions.ts";
import { occupancyAssumptions } from "./assumptions/occupancy-assumptions.ts";
import { climateAssumptions, ruleAssumptions } from "./assumptions/rule-assumptions.ts";
import type { HouseModel } from "./house-model.ts";
import type { PlanClimate } from "./plan-climate.ts";
import type { PlanAssumption } from "./plan-types.ts";

/**
 * Every assumption of a plan with where it came from: the survey's answers first, then the engine's own rules.
 * Shape: model, climate → list. Source: each entry names its own.
 */
export function planAssumptions(model: HouseModel, climate: PlanClimate): PlanAssumption[] {
  const { input } = model;
  return [
    ...coverAssumptions(input),
    ...houseAssumptions(input),
    ...occupancyAssumptions(input),
    ...climateAssumptions(input, climate),
    ...ruleAssumptions(model),
  ];
}
