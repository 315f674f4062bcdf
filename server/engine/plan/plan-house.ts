import { installedUnits, totalOutputW, unitOutputsW } from "../sizing/installed-units.ts";
import { ENGINE_VERSION } from "../version.ts";
import { planAssumptions } from "./assumptions.ts";
import { checkPlanInput } from "./check-input.ts";
import type { HousePlanInput } from "./house-input.ts";
import { houseModel } from "./house-model.ts";
import { isColdHoused } from "./no-heater.ts";
import { planAnnual } from "./plan-annual.ts";
import { planClimate } from "./plan-climate.ts";
import { planMonths } from "./plan-months.ts";
import { planSizing } from "./plan-sizing.ts";
import type { PlanResult } from "./plan-types.ts";
import { planWarnings } from "./warnings.ts";

/**
 * The whole heating plan of a house: climate of the site, both design nights of every month in every state, the year's energy,
 * sizing with options, assumptions with their origin, warnings in words.
 * Shape: one {@link HousePlanInput}, SI units → {@link PlanResult}. The same input always gives the same result.
 * Throws EngineInputError naming the quantity, its value and the range. Source: the functions it is made of.
 */
export function planHouse(input: HousePlanInput): PlanResult {
  checkPlanInput(input);
  const model = houseModel(input);
  const climate = planClimate(model);
  const units = installedUnits(input.heaters, input.site.elevationM);
  const outputs = unitOutputsW(units);
  const months = planMonths(model, climate, outputs, energyLimitW(totalOutputW(units), isColdHoused(model)));
  const sizing = planSizing(model, climate, months, units);
  const { floorAreaM2, volumeM3, perimeterM, coverAreaM2 } = model.geometry;
  return {
    engineVersion: ENGINE_VERSION,
    returnPeriodYears: input.returnPeriodYears,
    everydayPercent: input.everydayPercent,
    geometry: { floorAreaM2, volumeM3, perimeterM, coverAreaM2 },
    station: climate.station,
    months,
    sizing,
    annual: planAnnual(model, months, units),
    assumptions: planAssumptions(model, climate),
    warnings: planWarnings({ model, climate, months, sizing, units }),
  };
}

/** Without a heater the year shows what would be needed, except for animals that are kept without heat. */
function energyLimitW(installedW: number, coldHoused: boolean): number {
  if (installedW > 0) return installedW;
  return coldHoused ? 0 : Number.POSITIVE_INFINITY;
}
