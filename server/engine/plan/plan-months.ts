import type { HouseModel } from "./house-model.ts";
import { designSetpointC, nightBalances } from "./night-balances.ts";
import type { PlanClimate } from "./plan-climate.ts";
import { planMonthEnergy } from "./plan-energy.ts";
import type { HouseBalance, HouseStateId, MonthResult } from "./plan-types.ts";

/** States in which a house is meant to hold: as usual, and with the screens open for snow. */
const MEANT_TO_HOLD: readonly HouseStateId[] = ["screensShut", "snowOnRoof"];

/**
 * The twelve months of a plan: both design nights in every state, and the month's energy.
 * Shape: model, climate, output of every single heater W, heater limit for the energy W → months. Source [DESIGNNIGHT].
 */
export function planMonths(
  model: HouseModel,
  climate: PlanClimate,
  unitOutputsW: readonly number[],
  heaterLimitW: number,
): MonthResult[] {
  return model.input.months.map((use, m) => {
    const normals = climate.months[m] as MonthResult["climate"];
    const night = (outdoorTempC: number) =>
      nightBalances(model, {
        month: m + 1,
        use,
        outdoorTempC,
        windMS: climate.windMS[m] ?? 0,
        soilTempC: climate.soilTempC,
        unitOutputsW,
      });
    const everyday = night(normals.everydayDesignC);
    const onceInYears = night(normals.onceInYearsDesignC);
    return {
      month: m + 1,
      occupied: use.occupied,
      setpointNightC: designSetpointC(model, use),
      setpointDayC: use.daySetpointC,
      climate: normals,
      everyday,
      onceInYears,
      everydayRequiredW: use.occupied ? greatestNeedW(everyday) : 0,
      onceInYearsRequiredW: use.occupied ? greatestNeedW(onceInYears) : 0,
      energy: planMonthEnergy(model, climate, m + 1, use, heaterLimitW),
    };
  });
}

function greatestNeedW(states: Partial<Record<HouseStateId, HouseBalance>>): number {
  return Math.max(0, ...MEANT_TO_HOLD.map((state) => states[state]?.requiredHeatW ?? 0));
}
