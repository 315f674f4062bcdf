import { STEFAN_BOLTZMANN_WM2K4, ZERO_CELSIUS_K } from "../constants.ts";
import { requireInRange } from "../errors.ts";

/** Which way heat flows through a surface or an air layer. Between walls and 30° from the level it counts as horizontal. */
export type HeatFlowDirection = "up" | "horizontal" | "down";

/** Convection at inner surfaces, W/(m² K). Source [ISO6946] annex. */
const INSIDE_CONVECTION_WM2K: Record<HeatFlowDirection, number> = { up: 5, horizontal: 2.5, down: 0.7 };

/** Conventional resistances for plane elements, m² K/W. Source [ISO6946] table of surface resistances. */
export const conventionalSurfaceM2KW: Record<HeatFlowDirection, { inside: number; outside: number }> = {
  up: { inside: 0.1, outside: 0.04 },
  horizontal: { inside: 0.13, outside: 0.04 },
  down: { inside: 0.17, outside: 0.04 },
};

/** Radiative coefficient of a black surface among surfaces of its own temperature. Units °C → W/(m² K). Valid −90 to 90 °C. Errors EngineInputError. Source [ISO6946]. */
export function blackRadiativeWM2K(tempC: number): number {
  requireInRange("tempC", tempC, -90, 90, "°C");
  return 4 * STEFAN_BOLTZMANN_WM2K4 * (tempC + ZERO_CELSIUS_K) ** 3;
}

/**
 * Resistance between room air and an inner surface.
 *
 * Units °C, 0 to 1 → m² K/W. Valid −90 to 90 °C. Errors EngineInputError. Source [ISO6946].
 */
export function insideSurfaceM2KW(direction: HeatFlowDirection, emissivity = 0.9, tempC = 20): number {
  requireInRange("emissivity", emissivity, 0, 1);
  return 1 / (INSIDE_CONVECTION_WM2K[direction] + emissivity * blackRadiativeWM2K(tempC));
}

/**
 * Resistance between an outer surface and the open air; convection 4 + 4 v.
 *
 * Units m/s, 0 to 1, °C → m² K/W. Valid 0 to 40 m/s. Errors EngineInputError. Source [ISO6946].
 */
export function outsideSurfaceM2KW(windMS: number, emissivity = 0.9, tempC = 0): number {
  requireInRange("windMS", windMS, 0, 40, "m/s");
  requireInRange("emissivity", emissivity, 0, 1);
  return 1 / (4 + 4 * windMS + emissivity * blackRadiativeWM2K(tempC));
}
