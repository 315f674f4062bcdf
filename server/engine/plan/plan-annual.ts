import type { HouseModel } from "./house-model.ts";
import type { MonthResult, PlanResult } from "./plan-types.ts";
import type { HeaterUnit } from "./sizing-types.ts";

/**
 * Fuel and carbon dioxide of a normal year. Where heaters are fitted their efficiencies are weighed by output.
 * Shape: model, months, fitted units → year. Source: heat over efficiency, gross heating value of the fuel.
 */
export function planAnnual(
  model: HouseModel,
  months: readonly MonthResult[],
  units: readonly HeaterUnit[],
): PlanResult["annual"] {
  const { fuel } = model.input;
  const sum = (pick: (month: MonthResult) => number) =>
    months.reduce((total, month) => total + pick(month), 0);
  const heaterKwh = sum((month) => month.energy.heaterKwh);
  const fuelKwhGross = heaterKwh / meanEfficiencyFrac(model, units);
  return {
    heaterKwh,
    heaterKwhM2: heaterKwh / model.geometry.floorAreaM2,
    unmetKwh: sum((month) => month.energy.unmetKwh),
    fuelId: fuel.id,
    fuelKwhGross,
    fuelAmount: fuelKwhGross / fuel.kwhGrossPerUnit,
    fuelUnit: fuel.unit,
    carbonDioxideKg: fuelKwhGross * fuel.carbonDioxideKgPerKwh,
  };
}

/** Mean efficiency of the fitted heaters, each weighed by the fuel its output needs; the fallback where none is fitted. */
export function meanEfficiencyFrac(model: HouseModel, units: readonly HeaterUnit[]): number {
  const fitted = model.input.heaters.filter((heater) => heater.count > 0);
  let outputW = 0;
  let burntW = 0;
  fitted.forEach((heater, index) => {
    const unitW = (units[index]?.outputW ?? 0) * heater.count;
    outputW += unitW;
    burntW += unitW / heater.efficiencyFrac;
  });
  return burntW > 0 ? outputW / burntW : model.input.fallbackEfficiencyFrac;
}
