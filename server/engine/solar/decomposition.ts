import { requireInRange } from "../errors.ts";

/**
 * Diffuse share of an hour's sun from its clearness index.
 *
 * Units 0 to 1.2 → 0 to 1. Errors EngineInputError. Source [ERBS1982].
 */
export function diffuseShareErbs(clearness: number): number {
  const k = requireInRange("clearness", clearness, 0, 1.2);
  if (k <= 0.22) return 1 - 0.09 * k;
  if (k <= 0.8) return 0.9511 - 0.1604 * k + 4.388 * k ** 2 - 16.638 * k ** 3 + 12.336 * k ** 4;
  return 0.165;
}

/** As {@link diffuseShareErbs}. Source [ORGILL-HOLLANDS1977]. */
export function diffuseShareOrgillHollands(clearness: number): number {
  const k = requireInRange("clearness", clearness, 0, 1.2);
  if (k < 0.35) return 1 - 0.249 * k;
  return k <= 0.75 ? 1.557 - 1.84 * k : 0.177;
}

/**
 * Diffuse share of a month's mean sun.
 *
 * Units: monthly clearness 0.3 to 0.8, hour angle of sunset in degrees → 0 to 1. Outside 0.3 to 0.8 the end value is taken.
 * Errors EngineInputError. Source [ERBS1982].
 */
export function diffuseShareMonthly(clearness: number, sunsetHourAngle: number): number {
  requireInRange("clearness", clearness, 0, 1);
  requireInRange("sunsetHourAngle", sunsetHourAngle, 0, 180, "°");
  const k = Math.min(0.8, Math.max(0.3, clearness));
  return sunsetHourAngle <= 81.4
    ? 1.391 - 3.56 * k + 4.189 * k ** 2 - 2.137 * k ** 3
    : 1.311 - 3.022 * k + 3.427 * k ** 2 - 1.821 * k ** 3;
}

/**
 * Share of a day's sun that falls in the hour around an hour angle.
 *
 * Units degrees → 1/h; 0 when the sun is down. The 24 values of a day do not add up to 1 and must be scaled.
 * Errors EngineInputError. Source [COLLARES-RABL1979].
 */
export function hourShareOfDay(hourAngleDeg: number, sunsetHourAngle: number): number {
  requireInRange("hourAngleDeg", hourAngleDeg, -180, 180, "°");
  requireInRange("sunsetHourAngle", sunsetHourAngle, 0, 180, "°");
  const a = 0.409 + 0.5016 * Math.sin(((sunsetHourAngle - 60) * Math.PI) / 180);
  const b = 0.6609 - 0.4767 * Math.sin(((sunsetHourAngle - 60) * Math.PI) / 180);
  return (
    diffuseHourShareOfDay(hourAngleDeg, sunsetHourAngle) * (a + b * Math.cos((hourAngleDeg * Math.PI) / 180))
  );
}

/** As {@link hourShareOfDay} for the diffuse part. Source [COLLARES-RABL1979] after Liu and Jordan. */
export function diffuseHourShareOfDay(hourAngleDeg: number, sunsetHourAngle: number): number {
  if (sunsetHourAngle === 0 || Math.abs(hourAngleDeg) >= sunsetHourAngle) return 0;
  const sunset = (sunsetHourAngle * Math.PI) / 180;
  const hour = (hourAngleDeg * Math.PI) / 180;
  const height = Math.cos(hour) - Math.cos(sunset);
  return ((Math.PI / 24) * height) / (Math.sin(sunset) - sunset * Math.cos(sunset));
}
