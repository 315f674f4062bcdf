import { EngineInputError, requireInRange } from "../errors.ts";
import { DAYS_IN_MONTH, requireTwelve } from "./design-temperature.ts";
import { hourlySpreadK, typicalDailySpreadK } from "./hourly-spread.ts";
import type { ClimateFlag, StationClimate } from "./station-climate.ts";

/** How a figure of the climate came about, as printed beside it. */
export type FigureOrigin = "read" | "derived" | "estimated" | "typical";

/** Wind 10 m above open ground where a station reports none, m/s. Source [SPREADPRACTICE]. */
export const TYPICAL_WIND_MS = 3.5;
/** Dew point below the mean daily minimum where no humidity is reported, K. Source [FAO56]: 1 to 2 K in humid places. */
const DEW_BELOW_MINIMUM_K = 1.5;
/** Share of the outside sun per square root of the daily range, K^-0.5. Source [HARGREAVES1982], inland. */
const HARGREAVES_PER_ROOT_K = 0.16;

export interface FilledMonths {
  humidityFrac: number[];
  windMS: number[];
  globalKwhM2Day: number[];
  dailySpreadK: number[];
  hourlySpreadK: number[];
  origins: {
    humidity: FigureOrigin;
    wind: FigureOrigin;
    global: FigureOrigin;
    spread: FigureOrigin;
  };
}

/**
 * Completes a station's months: humidity from dew point or daily minimum, a typical wind, sun from the daily range, spreads
 * from the swing of the year. Nothing that the station reports is changed; each quantity says how it came about.
 * Shape: station, mean daily sun outside the atmosphere for each month in kWh/m² (0 to 15) → twelve values each.
 * Throws EngineInputError for lists that are not twelve long or minima above maxima. Source [FAO56], [HARGREAVES1982], [SPREADPRACTICE].
 */
export function fillMissingMonths(
  station: StationClimate,
  outsideSunKwhM2Day: readonly number[],
): FilledMonths {
  requireTwelve("outsideSunKwhM2Day", outsideSunKwhM2Day);
  requireTwelve("meanTempC", station.meanTempC);
  requireTwelve("minTempC", station.minTempC);
  requireTwelve("maxTempC", station.maxTempC);
  const rangesK = station.maxTempC.map((max, m) => dailyRangeK(station, max, m));
  const spread = filledSpread(station, rangesK);
  return {
    ...spread.values,
    humidityFrac: filledHumidity(station),
    windMS: station.windMS ?? Array<number>(12).fill(TYPICAL_WIND_MS),
    globalKwhM2Day:
      station.globalKwhM2Day ??
      rangesK.map(
        (range, m) => Math.min(0.8, HARGREAVES_PER_ROOT_K * Math.sqrt(range)) * (outsideSunKwhM2Day[m] ?? 0),
      ),
    origins: {
      humidity: station.humidityFrac
        ? originOf(station.flags.humidity)
        : station.dewPointC
          ? "derived"
          : "estimated",
      wind: station.windMS ? originOf(station.flags.wind) : "typical",
      global: station.globalKwhM2Day ? originOf(station.flags.global) : "estimated",
      spread: spread.origin,
    },
  };
}

function dailyRangeK(station: StationClimate, maxTempC: number, m: number): number {
  const minTempC = station.minTempC[m] ?? 0;
  requireInRange("meanTempC", station.meanTempC[m] ?? Number.NaN, -70, 50, "°C", m);
  requireInRange("maxTempC", maxTempC, -70, 60, "°C", m);
  requireInRange("minTempC", minTempC, -80, 50, "°C", m);
  if (maxTempC < minTempC)
    throw new EngineInputError({
      quantity: "minTempC",
      value: minTempC,
      reason: "inconsistent",
      index: m,
      note: "The mean minimum lies above the mean maximum.",
    });
  return maxTempC - minTempC;
}

function filledHumidity(station: StationClimate): number[] {
  if (station.humidityFrac) return station.humidityFrac;
  return station.meanTempC.map((mean, m) => {
    const dewPointC = station.dewPointC?.[m] ?? (station.minTempC[m] ?? mean) - DEW_BELOW_MINIMUM_K;
    return Math.min(1, vapourPressureRatio(dewPointC, mean));
  });
}

/** Saturation pressure at the dew point over that at the air temperature. Source [FAO56], over water. */
function vapourPressureRatio(dewPointC: number, airTempC: number): number {
  const exponent = (tempC: number) => (17.27 * tempC) / (tempC + 237.3);
  return Math.exp(exponent(dewPointC) - exponent(airTempC));
}

function filledSpread(station: StationClimate, rangesK: number[]) {
  const swingK = Math.max(...station.meanTempC) - Math.min(...station.meanTempC);
  const coldestC = Math.min(...station.meanTempC);
  const dailySpreadK =
    station.dailySpreadK ??
    station.meanTempC.map((mean) => typicalDailySpreadK(swingK, swingK > 0 ? (mean - coldestC) / swingK : 0));
  const hourly =
    station.hourlySpreadK ?? dailySpreadK.map((daily, m) => hourlySpreadK(rangesK[m] ?? 0, daily));
  const origin: FigureOrigin = station.dailySpreadK ? originOf(station.flags.spread) : "typical";
  return { values: { dailySpreadK, hourlySpreadK: hourly }, origin };
}

function originOf(flag: ClimateFlag): FigureOrigin {
  return flag === "R" || flag === "G" || flag === "B" ? "read" : flag === "D" ? "derived" : "estimated";
}

/** Hours of each month, for turning means into sums. */
export const HOURS_IN_MONTH: readonly number[] = DAYS_IN_MONTH.map((days) => days * 24);
