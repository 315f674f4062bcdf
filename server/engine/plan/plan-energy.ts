import { dewPointC } from "../air/moist-air.ts";
import type { OutsideHour } from "../balance/surface-model.ts";
import { DAYS_IN_MONTH } from "../climate/design-temperature.ts";
import { monthEnergy } from "../energy/month-energy.ts";
import { monthSun } from "../energy/month-sun.ts";
import { skyTemperatureC } from "../envelope/sky.ts";
import { houseAir } from "./house-air.ts";
import type { MonthUse } from "./house-input.ts";
import type { HouseModel } from "./house-model.ts";
import { insideHumidityFrac } from "./night-balances.ts";
import type { PlanClimate } from "./plan-climate.ts";
import type { MonthEnergy } from "./plan-types.ts";

/** Sensible share of the sun in a house without crop. Source [ALBEDO]. */
const EMPTY_SENSIBLE_SHARE = 0.95;
/** Share of the lamps' power that warms the air. Source [LAMPHEAT]. */
export const LAMP_SENSIBLE_SHARE = 0.8;
/** Vents of greenhouses and fans of barns answer this far above the set-point, K. Source [VENTPOINT]. */
const VENT_ABOVE_K = { greenhouse: 3, barn: 1 } as const;

/**
 * Energy of one month of a plan; all zero where the house is not in use.
 * Shape: model, climate, month 1 to 12, its use, heater limit W → month's energy. Source as the energy functions.
 */
export function planMonthEnergy(
  model: HouseModel,
  climate: PlanClimate,
  month: number,
  use: MonthUse,
  heaterLimitW: number,
): MonthEnergy {
  const { input, geometry, hoursShell } = model;
  const m = month - 1;
  const normals = climate.months[m];
  if (!use.occupied || normals === undefined) return noEnergy(normals?.meanTempC ?? 0);
  const air = houseAir(model, use);
  const warmest = Math.max(use.nightSetpointC, use.daySetpointC);
  return monthEnergy({
    shell: hoursShell,
    days: DAYS_IN_MONTH[m] ?? 30,
    meanTempC: normals.meanTempC,
    dailySpreadK: climate.site.filled.dailySpreadK[m] ?? 3,
    dailyRangeK: normals.meanMaxTempC - normals.meanMinTempC,
    outsideAt: (airTempC) => meanHour(climate, m, airTempC),
    sun: monthSun({
      latitudeDeg: input.site.latitudeDeg,
      longitudeDeg: input.site.longitudeDeg,
      month,
      globalKwhM2Day: normals.globalKwhM2Day,
      surfaces: hoursShell.surfaces,
      groupCount: hoursShell.groups.length,
      shape: input.shape,
      floorAreaM2: geometry.floorAreaM2,
    }),
    nightSetpointC: use.nightSetpointC,
    daySetpointC: use.daySetpointC,
    screenByNight: input.screen !== null,
    sensibleShareFrac: input.crop?.sensibleShareFrac ?? EMPTY_SENSIBLE_SHARE,
    lampHeatW: input.lampsWM2 * geometry.floorAreaM2 * LAMP_SENSIBLE_SHARE,
    lampHours: input.lampHoursPerDay,
    air: (insideTempC, outdoorTempC) => air.flowsAt(insideTempC, outdoorTempC).air,
    stockSensibleW: (insideTempC) => air.stockAt(insideTempC).sensibleW,
    ventAboveK: VENT_ABOVE_K[input.kind],
    floorAreaM2: geometry.floorAreaM2,
    heaterLimitW,
    insideDewPointC: dewPointC(warmest, insideHumidityFrac(model, use)),
  });
}

/** Mean weather of a month at some temperature: its humidity, cloud and wind. */
function meanHour(climate: PlanClimate, m: number, airTempC: number): OutsideHour {
  const humidityFrac = Math.max(0.05, climate.months[m]?.humidityFrac ?? 0.8);
  const skyTempC = skyTemperatureC({
    airTempC: Math.min(49, Math.max(-59, airTempC)),
    dewPointC: Math.min(airTempC, dewPointC(airTempC, humidityFrac)),
    cloudFrac: climate.cloudFrac[m] ?? 0,
  });
  return { airTempC, skyTempC, windMS: climate.windMS[m] ?? 0, snow: false };
}

function noEnergy(meanTempC: number): MonthEnergy {
  return {
    heaterKwh: 0,
    lossesKwh: { cover: 0, sky: 0, air: 0, ground: 0 },
    gainsKwh: { sun: 0, stock: 0, lights: 0 },
    ventedSurplusKwh: 0,
    unmetKwh: 0,
    heatingHours: 0,
    hoursBelowSetpoint: 0,
    wetCoverHours: 0,
    heaterByHourW: Array<number>(24).fill(0),
    outdoorByHourC: Array<number>(24).fill(meanTempC),
  };
}
