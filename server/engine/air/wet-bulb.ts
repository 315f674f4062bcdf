import { STANDARD_PRESSURE_PA } from "../constants.ts";
import { requireInRange } from "../errors.ts";
import { bisect } from "../numeric/bisect.ts";
import { dewPointC, humidityRatio } from "./moist-air.ts";

/** Water in air of a temperature whose wet bulb stands at another. Source [ASHRAE-F17] equations 33 (water) and 35 (ice). */
function ratioFromWetBulb(tempC: number, wetBulbC: number, pressurePa: number): number {
  const saturated = humidityRatio(wetBulbC, 1, pressurePa);
  return wetBulbC >= 0
    ? ((2501 - 2.326 * wetBulbC) * saturated - 1.006 * (tempC - wetBulbC)) /
        (2501 + 1.86 * tempC - 4.186 * wetBulbC)
    : ((2830 - 0.24 * wetBulbC) * saturated - 1.006 * (tempC - wetBulbC)) /
        (2830 + 1.86 * tempC - 2.1 * wetBulbC);
}

/**
 * Temperature a wetted thermometer shows, over ice below 0 °C.
 *
 * Units °C, 0.001 to 1, Pa → °C. Valid −60 to 60 °C. Errors EngineInputError. Source [ASHRAE-F17] equations 33 and 35.
 */
export function wetBulbC(tempC: number, humidityFrac: number, pressurePa = STANDARD_PRESSURE_PA): number {
  requireInRange("tempC", tempC, -60, 60, "°C");
  const ratio = humidityRatio(tempC, humidityFrac, pressurePa);
  const lowest = Math.max(-89, dewPointC(tempC, humidityFrac) - 0.01);
  return bisect((wet) => ratioFromWetBulb(tempC, wet, pressurePa) - ratio, lowest, tempC, 1e-7);
}
