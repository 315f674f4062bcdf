import { SOLAR_CONSTANT_WM2 } from "../constants.ts";
import { requireInRange } from "../errors.ts";
import { diffuseHourShareOfDay, diffuseShareMonthly, hourShareOfDay } from "./decomposition.ts";
import {
  dailyExtraterrestrialKwhM2,
  declinationDeg,
  distanceFactor,
  equationOfTimeMin,
  sunsetHourAngleDeg,
} from "./extraterrestrial.ts";
import { representativeDayOfYear, type SunPosition, solarMidnightMs, sunPosition } from "./sun-position.ts";

/** The sun of one hour, at its middle. */
export interface SunHour {
  /** Hours from midnight, 0.5 to 23.5, in true solar time of the place. */
  hour: number;
  sun: SunPosition;
  ghiWM2: number;
  dniWM2: number;
  dhiWM2: number;
  extraterrestrialWM2: number;
}

export interface RepresentativeDayInput {
  latitudeDeg: number;
  longitudeDeg: number;
  /** 1 to 12. */
  month: number;
  /** Mean daily sum on the flat, kWh/m². */
  globalKwhM2Day: number;
}

/** Beam is not set free below this elevation, where dividing by the sine would blow small errors up. */
const LEAST_BEAM_ELEVATION_DEG = 3;
/** More than this share of the extraterrestrial beam is not believed. */
const MOST_BEAM_SHARE = 0.8;

/**
 * The mean day of a month in 24 hours whose sum is the month's mean.
 *
 * Shapes: 24 hours. Units W/m², degrees. Valid sums 0 to 12 kWh/m² a day, not more than outside the air.
 * Errors EngineInputError when the sum is more than the sun gives outside the air.
 * Source [ERBS1982] for the diffuse share, [COLLARES-RABL1979] for the hours, day of the month [KLEIN1977].
 */
export function representativeDaySun({
  latitudeDeg,
  longitudeDeg,
  month,
  globalKwhM2Day,
}: RepresentativeDayInput): SunHour[] {
  requireInRange("month", month, 1, 12);
  const dayOfYear = representativeDayOfYear[month - 1] as number;
  const outside = dailyExtraterrestrialKwhM2(latitudeDeg, dayOfYear);
  // A monthly mean may lie a little above the representative day's own figure near the poles.
  requireInRange("globalKwhM2Day", globalKwhM2Day, 0, Math.max(0.05, outside * 1.05), "kWh/m²");
  const sunset = sunsetHourAngleDeg(latitudeDeg, declinationDeg(dayOfYear));
  const clearness = outside > 0 ? Math.min(1, globalKwhM2Day / outside) : 0;
  const diffuseShare = diffuseShareMonthly(clearness, sunset);
  // True solar time, so that the day is even around noon.
  const midnight = solarMidnightMs(dayOfYear, longitudeDeg) - equationOfTimeMin(dayOfYear) * 60_000;
  const normal = SOLAR_CONSTANT_WM2 * distanceFactor(dayOfYear);
  const hours = Array.from({ length: 24 }, (_, index) => {
    const sun = sunPosition(midnight + (index + 0.5) * 3_600_000, latitudeDeg, longitudeDeg);
    const angle = (index + 0.5 - 12) * 15;
    const up = sun.elevationDeg > 0;
    return {
      hour: index + 0.5,
      sun,
      global: up ? hourShareOfDay(angle, sunset) : 0,
      diffuse: up ? diffuseHourShareOfDay(angle, sunset) : 0,
    };
  });
  const globalSum = hours.reduce((sum, hour) => sum + hour.global, 0);
  const diffuseSum = hours.reduce((sum, hour) => sum + hour.diffuse, 0);
  return hours.map(({ hour, sun, global, diffuse }) => {
    const ghiWM2 = globalSum > 0 ? (1000 * globalKwhM2Day * global) / globalSum : 0;
    const wishedDiffuse = diffuseSum > 0 ? (1000 * globalKwhM2Day * diffuseShare * diffuse) / diffuseSum : 0;
    return { hour, sun, extraterrestrialWM2: normal, ghiWM2, ...split(ghiWM2, wishedDiffuse, sun, normal) };
  });
}

/** Beam and diffuse that add up to the flat's sum, with a beam that can be believed. */
function split(ghiWM2: number, wishedDiffuseWM2: number, sun: SunPosition, normalWM2: number) {
  if (sun.elevationDeg < LEAST_BEAM_ELEVATION_DEG) return { dniWM2: 0, dhiWM2: ghiWM2 };
  const sine = Math.sin((sun.elevationDeg * Math.PI) / 180);
  const beam = Math.max(0, ghiWM2 - wishedDiffuseWM2) / sine;
  const dniWM2 = Math.min(beam, MOST_BEAM_SHARE * normalWM2);
  return { dniWM2, dhiWM2: ghiWM2 - dniWM2 * sine };
}
