import { dewPointC } from "../air/moist-air.ts";
import { type BalanceHour, houseBalance, withOtherHeat } from "../balance/house-balance.ts";
import type { OutsideHour, ScreenPosition } from "../balance/surface-model.ts";
import { skyTemperatureC } from "../envelope/sky.ts";
import { type GovernedAir, type HouseAir, houseAir, NIGHT_HUMIDITY_FRAC } from "./house-air.ts";
import type { MonthUse } from "./house-input.ts";
import type { HouseModel } from "./house-model.ts";
import type { HouseBalance, HouseStateId } from "./plan-types.ts";

/** Snow falls at about this temperature, °C. Source [SNOWRULE]. */
export const SNOW_TEMP_C = -2;
/** Where the house has neither crop nor stock, humidity of its air. Source [DESIGNNIGHT]. */
const EMPTY_HUMIDITY_FRAC = 0.7;

export interface NightInput {
  month: number;
  use: MonthUse;
  outdoorTempC: number;
  windMS: number;
  soilTempC: number;
  /** Outputs of the fitted heaters, one entry for each unit, W. */
  unitOutputsW: readonly number[];
}

/** Set-point a house is designed for: the night's in a greenhouse, the higher of both in a barn. Source [BARNRULE]. */
export function designSetpointC(model: HouseModel, use: MonthUse): number {
  return model.input.kind === "barn" ? Math.max(use.nightSetpointC, use.daySetpointC) : use.nightSetpointC;
}

/** Relative humidity of the inside air. Source [DESIGNNIGHT]. */
export function insideHumidityFrac(model: HouseModel, use: MonthUse): number {
  const { stock, crop } = model.input;
  if (stock !== null && use.headCount > 0) return stock.humidityLimitFrac;
  return crop?.humidityFrac ?? EMPTY_HUMIDITY_FRAC;
}

/**
 * The house on one design night in every state that matters: as usual, with screens open, under snow, and with the largest
 * heater out. Snow opens the screens where the house says so; it falls from an overcast sky at −2 °C, or at the night's own
 * temperature where that is between −2 and 0 °C. Months without use get the usual state alone.
 * Shape: model, night → balances by state. Source [DESIGNNIGHT], [SNOWRULE].
 */
export function nightBalances(
  model: HouseModel,
  night: NightInput,
): Partial<Record<HouseStateId, HouseBalance>> {
  const { input } = model;
  const air = houseAir(model, night.use);
  const hasScreen = input.screen !== null;
  const clear = clearNight(night.outdoorTempC, night.windMS);
  const usualHour = usualHourOf(model, night, clear, air);
  const usual = houseBalance(model.designShell, usualHour);
  const states: Partial<Record<HouseStateId, HouseBalance>> = { screensShut: usual };
  if (!night.use.occupied) return states;
  if (hasScreen)
    states.screensOpen = houseBalance(
      model.designShell,
      hourOf(model, night, "screensOpen", clear, "open", air),
    );
  if (input.screen?.opensForSnow && night.outdoorTempC <= 0) {
    const snow = snowyNight(Math.max(night.outdoorTempC, SNOW_TEMP_C), night.windMS);
    states.snowOnRoof = houseBalance(
      model.designShell,
      hourOf(model, night, "snowOnRoof", snow, "open", air),
    );
  }
  if (night.unitOutputsW.length > 0)
    states.largestUnitOut = withOtherHeat(
      model.designShell,
      usualHour,
      usual,
      "largestUnitOut",
      usualHour.installedHeatW - Math.max(...night.unitOutputsW),
    );
  return states;
}

/** The house on a design night as usual: screens shut, clear sky, all heaters running. Shape: model, night → balance. Source [DESIGNNIGHT]. */
export function usualNight(model: HouseModel, night: NightInput): HouseBalance {
  const clear = clearNight(night.outdoorTempC, night.windMS);
  return houseBalance(model.designShell, usualHourOf(model, night, clear, houseAir(model, night.use)));
}

function usualHourOf(model: HouseModel, night: NightInput, clear: OutsideHour, air: HouseAir): BalanceHour {
  const screen = model.input.screen === null ? "open" : "shut";
  return hourOf(model, night, "screensShut", clear, screen, air);
}

function hourOf(
  model: HouseModel,
  night: NightInput,
  state: HouseStateId,
  outside: OutsideHour,
  screen: ScreenPosition,
  air: HouseAir,
): BalanceHour {
  const { use } = night;
  const setpointC = designSetpointC(model, use);
  const { air: flows, governs }: GovernedAir = air.flowsAt(setpointC, outside.airTempC);
  const humidityFrac = insideHumidityFrac(model, use);
  return {
    month: night.month,
    state,
    outside,
    soilTempC: night.soilTempC,
    screen,
    air: flows,
    airGoverns: governs,
    setpointC,
    criticalTempC: model.input.criticalTempC,
    occupied: use.occupied,
    insideHumidityFrac: humidityFrac,
    insideDewPointC: dewPointC(setpointC, humidityFrac),
    sunGainW: 0,
    groupSunWM2: [],
    lightsW: 0,
    stockSensibleW: (insideTempC) => air.nightRatio * air.stockAt(insideTempC).sensibleW,
    installedHeatW: night.unitOutputsW.reduce((sum, output) => sum + output, 0),
  };
}

/**
 * Clear, dark night of a given temperature. Shape: °C, m/s → hour. Source [DESIGNNIGHT], sky [BERDAHL-MARTIN1984].
 */
export function clearNight(airTempC: number, windMS: number): OutsideHour {
  const dew = dewPointC(airTempC, NIGHT_HUMIDITY_FRAC);
  return { airTempC, skyTempC: skyTemperatureC({ airTempC, dewPointC: dew }), windMS, snow: false };
}

function snowyNight(airTempC: number, windMS: number): OutsideHour {
  const dew = dewPointC(airTempC, NIGHT_HUMIDITY_FRAC);
  return {
    airTempC,
    skyTempC: skyTemperatureC({ airTempC, dewPointC: dew, cloudFrac: 1 }),
    windMS,
    snow: true,
  };
}
