import { SOLAR_CONSTANT_WM2 } from "../constants.ts";
import { requireInRange } from "../errors.ts";

const radians = (degreesValue: number) => (degreesValue * Math.PI) / 180;
const dayAngle = (dayOfYear: number) => (2 * Math.PI * (dayOfYear - 1)) / 365;

/** Declination of the sun. Units: day 1 to 366 → degrees. Errors EngineInputError. Source [SPENCER1971]. */
export function declinationDeg(dayOfYear: number): number {
  const b = dayAngle(requireInRange("dayOfYear", dayOfYear, 1, 366));
  const value =
    0.006918 -
    0.399912 * Math.cos(b) +
    0.070257 * Math.sin(b) -
    0.006758 * Math.cos(2 * b) +
    0.000907 * Math.sin(2 * b) -
    0.002697 * Math.cos(3 * b) +
    0.00148 * Math.sin(3 * b);
  return (value * 180) / Math.PI;
}

/** Equation of time. Units: day 1 to 366 → minutes. Errors EngineInputError. Source [SPENCER1971]. */
export function equationOfTimeMin(dayOfYear: number): number {
  const b = dayAngle(requireInRange("dayOfYear", dayOfYear, 1, 366));
  return (
    229.18 *
    (0.0000075 +
      0.001868 * Math.cos(b) -
      0.032077 * Math.sin(b) -
      0.014615 * Math.cos(2 * b) -
      0.040849 * Math.sin(2 * b))
  );
}

/** Square of mean over true distance of the sun. Units: day 1 to 366 → ratio. Errors EngineInputError. Source [SPENCER1971]. */
export function distanceFactor(dayOfYear: number): number {
  const b = dayAngle(requireInRange("dayOfYear", dayOfYear, 1, 366));
  return (
    1.00011 +
    0.034221 * Math.cos(b) +
    0.00128 * Math.sin(b) +
    0.000719 * Math.cos(2 * b) +
    0.000077 * Math.sin(2 * b)
  );
}

/** Hour angle of sunset, 0 in polar night and 180 in polar day. Units degrees. Errors EngineInputError. Source [DUFFIE-BECKMAN] equation 1.6.10. */
export function sunsetHourAngleDeg(latitudeDeg: number, declination: number): number {
  requireInRange("latitudeDeg", latitudeDeg, -90, 90, "°");
  requireInRange("declination", declination, -24, 24, "°");
  const cosine = -Math.tan(radians(latitudeDeg)) * Math.tan(radians(declination));
  return (Math.acos(Math.min(1, Math.max(-1, cosine))) * 180) / Math.PI;
}

/**
 * Sun on a flat surface outside the air over one day.
 *
 * Units: degrees, day, W/m² → kWh/m². Errors EngineInputError. Source [DUFFIE-BECKMAN] equation 1.10.3.
 */
export function dailyExtraterrestrialKwhM2(
  latitudeDeg: number,
  dayOfYear: number,
  solarConstantWM2 = SOLAR_CONSTANT_WM2,
): number {
  const declination = declinationDeg(dayOfYear);
  const sunset = radians(sunsetHourAngleDeg(latitudeDeg, declination));
  const phi = radians(latitudeDeg);
  const delta = radians(declination);
  const shape = Math.cos(phi) * Math.cos(delta) * Math.sin(sunset) + sunset * Math.sin(phi) * Math.sin(delta);
  return Math.max(0, ((24 / Math.PI) * solarConstantWM2 * distanceFactor(dayOfYear) * shape) / 1000);
}
