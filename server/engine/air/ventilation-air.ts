import { STANDARD_PRESSURE_PA } from "../constants.ts";
import { DRY_AIR_HEAT_JKGK, specificVolumeM3Kg, VAPOUR_HEAT_JKGK } from "./moist-air.ts";

/**
 * Heat to warm the outdoor air that replaces one cubic metre of exhaust, by one kelvin. The exhaust is measured at inside
 * conditions; the air that is warmed still holds only the water it came in with.
 *
 * Units °C, kg/kg, Pa → Wh/(m³ K); 0.32 to 0.34 near the sea. Errors EngineInputError. Source [ASHRAE-F17].
 */
export function exhaustHeatWhM3K(
  insideTempC: number,
  insideRatio: number,
  outdoorRatio: number,
  pressurePa = STANDARD_PRESSURE_PA,
): number {
  const volume = specificVolumeM3Kg(insideTempC, insideRatio, pressurePa);
  return (DRY_AIR_HEAT_JKGK + VAPOUR_HEAT_JKGK * outdoorRatio) / volume / 3600;
}
