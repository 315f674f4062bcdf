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

/** Loss of recovery to defrosting, as a share of the recovery. Source [DEFROST]: 5 to 15 % of the time. */
const DEFROST_SHARE = 0.1;
/** Exhaust this far below freezing defrosts all it ever will; in between the loss grows evenly, so that nothing jumps. */
const DEFROST_FADE_K = 2;

/**
 * Share of the ventilation heat that an exchanger gives back; a tenth less where its exhaust would freeze.
 * Shape: rated share 0 to 0.9, inside °C, outside °C (−80 to 60) → share. Throws EngineInputError outside. Source [DEFROST].
 */
export function recoveredShareFrac(ratedFrac: number, insideTempC: number, outdoorTempC: number): number {
  requireInRange("ratedFrac", ratedFrac, 0, 0.9);
  requireInRange("insideTempC", insideTempC, -80, 60, "°C");
  requireInRange("outdoorTempC", outdoorTempC, -80, 60, "°C");
  const exhaustC = insideTempC - ratedFrac * (insideTempC - outdoorTempC);
  const frosted = Math.min(1, Math.max(0, -exhaustC / DEFROST_FADE_K));
  return ratedFrac * (1 - DEFROST_SHARE * frosted);
}
