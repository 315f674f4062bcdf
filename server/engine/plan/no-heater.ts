import type { HouseModel } from "./house-model.ts";
import type { MonthResult } from "./plan-types.ts";
import type { HeaterUnit } from "./sizing-types.ts";

/** Animals that are kept without heat. Source [COLDHOUSED]. */
const COLD_HOUSED = ["calf", "beef", "heifer", "dairyCow", "ewe", "goatDry", "goatMilking", "horse"];

/** Whether a house holds animals that are kept without heat. Shape: model → boolean. Source [COLDHOUSED]. */
export function isColdHoused(model: HouseModel): boolean {
  const { stock } = model.input;
  return stock !== null && COLD_HOUSED.includes(stock.classId);
}

/**
 * Why no heater is the right answer, in words; null where heat is needed.
 * Shape: model, months, fitted units → sentence or null. Source [COLDHOUSED].
 */
export function noHeaterReason(
  model: HouseModel,
  months: readonly MonthResult[],
  existing: readonly HeaterUnit[],
): string | null {
  if (!months.some((month) => month.occupied)) return "The house is not in use in any month.";
  const needed = Math.max(...months.map((month) => month.onceInYearsRequiredW));
  const stocked = model.input.stock !== null && model.input.months.some((month) => month.headCount > 0);
  if (needed <= 0)
    return stocked
      ? "The animals give more heat than the house loses, even on the coldest night. More air keeps it from getting too warm."
      : "Nothing has to be made up in any month: the wanted temperature lies below the coldest nights.";
  if (isColdHoused(model) && stocked && existing.length === 0) {
    const kilowatts = Math.round(needed / 1000);
    return `These animals are kept without heat: a dry bed, no draughts and enough air do more than a warm house, which would take ${kilowatts} kW. Heat a pen for the newborn and the sick instead.`;
  }
  return null;
}
