import { STANDARD_PRESSURE_PA } from "../constants.ts";
import { requireInRange } from "../errors.ts";

/** Heat that one m³ of air holds per kelvin at sea level, Wh/(m³ K): 1.2 kg/m³ × 1006 J/(kg K) / 3600. Source [AIRHEAT]. */
export const AIR_HEAT_WHM3K = (1.2 * 1006) / 3600;

/**
 * Heat carried off by an air flow per kelvin.
 * Shape: m³/h (0 to 1e8), pressure Pa (40,000 to 110,000) → W/K. Throws EngineInputError outside. Source [AIRHEAT].
 */
export function airHeatWK(flowM3H: number, pressurePa: number): number {
  requireInRange("flowM3H", flowM3H, 0, 1e8, "m³/h");
  requireInRange("pressurePa", pressurePa, 40_000, 110_000, "Pa");
  return AIR_HEAT_WHM3K * flowM3H * (pressurePa / STANDARD_PRESSURE_PA);
}
