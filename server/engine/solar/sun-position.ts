import { getPosition } from "suncalc";
import { requireInRange } from "../errors.ts";

export interface SunPosition {
  /** Of the sun's centre above the horizon, refraction left out; negative at night. */
  elevationDeg: number;
  /** Clockwise from true north. */
  azimuthDeg: number;
}

/**
 * Refraction as suncalc adds it, in degrees: Saemundsson's formula for a true altitude, held at its value on the horizon below it.
 * Source [SAEMUNDSSON1986] in the form of Meeus.
 */
function refractionDeg(trueElevationDeg: number): number {
  const altitude = (Math.max(0, trueElevationDeg) * Math.PI) / 180;
  const radians = 0.0002967 / Math.tan(altitude + 0.00312536 / (altitude + 0.08901179));
  return (radians * 180) / Math.PI;
}

const HORIZON_REFRACTION_DEG = refractionDeg(0);

/** Takes suncalc's refraction out again: the geometric elevation decides the angle at which beam sun meets a surface. */
function withoutRefraction(apparentDeg: number): number {
  if (apparentDeg <= HORIZON_REFRACTION_DEG) return apparentDeg - HORIZON_REFRACTION_DEG;
  let trueDeg = apparentDeg;
  for (let step = 0; step < 8; step += 1) {
    const next = apparentDeg - refractionDeg(Math.max(0, trueDeg));
    if (Math.abs(next - trueDeg) < 1e-9) return next;
    trueDeg = next;
  }
  return trueDeg;
}

/**
 * Where the sun stands.
 *
 * @param timeMs instant in milliseconds since 1970 UTC
 * Units degrees. Valid years 1900 to 2150, all latitudes. Errors EngineInputError.
 * Source [SUNCALC]; its refraction is taken out.
 */
export function sunPosition(timeMs: number, latitudeDeg: number, longitudeDeg: number): SunPosition {
  requireInRange("timeMs", timeMs, -2_208_988_800_000, 5_680_281_600_000, "ms");
  requireInRange("latitudeDeg", latitudeDeg, -90, 90, "°");
  requireInRange("longitudeDeg", longitudeDeg, -180, 180, "°");
  const { altitude, azimuth } = getPosition(new Date(timeMs), latitudeDeg, longitudeDeg);
  return { elevationDeg: withoutRefraction(altitude), azimuthDeg: azimuth };
}

/** Day of the year on which the sun of a month is nearest its monthly mean, January first. Source [KLEIN1977]. */
export const representativeDayOfYear = [17, 47, 75, 105, 135, 162, 198, 228, 258, 288, 318, 344] as const;

/** A year without a leap day in whose days the representative days are taken. */
const REFERENCE_YEAR = 2026;
const DAY_MS = 86_400_000;
const HOUR_MS = 3_600_000;

/**
 * Start of a day of the year in mean solar time of the place, in milliseconds since 1970 UTC.
 * Units: day 1 to 365, degrees east → ms. Errors EngineInputError. Source: 15° of longitude are one hour.
 */
export function solarMidnightMs(dayOfYear: number, longitudeDeg: number): number {
  requireInRange("dayOfYear", dayOfYear, 1, 366);
  return Date.UTC(REFERENCE_YEAR, 0, 1) + (dayOfYear - 1) * DAY_MS - (longitudeDeg / 15) * HOUR_MS;
}
