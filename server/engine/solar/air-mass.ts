import { STANDARD_PRESSURE_PA } from "../constants.ts";
import { requireInRange } from "../errors.ts";

/**
 * Path of the beam through the air in units of the upright path.
 *
 * Units: apparent zenith angle in degrees → ratio. Valid 0 to 90°. Errors EngineInputError. Source [KASTEN-YOUNG1989].
 */
export function relativeAirMass(zenithDeg: number): number {
  requireInRange("zenithDeg", zenithDeg, 0, 90, "°");
  return 1 / (Math.cos((zenithDeg * Math.PI) / 180) + 0.50572 * (96.07995 - zenithDeg) ** -1.6364);
}

/** The same for thinner air. Units: ratio, Pa → ratio. Errors EngineInputError. Source [KASTEN-YOUNG1989]. */
export function absoluteAirMass(airMass: number, pressurePa: number): number {
  requireInRange("pressurePa", pressurePa, 40_000, 120_000, "Pa");
  return (airMass * pressurePa) / STANDARD_PRESSURE_PA;
}
