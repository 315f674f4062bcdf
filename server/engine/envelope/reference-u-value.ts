import { outsideConvectionWM2K } from "./convection.ts";
import { solveCoverBalance } from "./cover-balance.ts";
import type { CoverStack } from "./cover-types.ts";

/**
 * Conditions under which covers of the library are compared: 18 °C inside with the floor as warm as the air, −10 °C outside,
 * wind 6.7 m/s (15 mph) as for published tables, a sky half way between clear and overcast (−20 °C), a roof of 25°.
 */
export const REFERENCE_CONDITIONS = {
  insideAirC: 18,
  outsideAirC: -10,
  skyC: -20,
  windMS: 6.7,
  tiltDeg: 25,
} as const;

/**
 * Whole-cover U-value of a stack, air to air, under the {@link REFERENCE_CONDITIONS}.
 *
 * Units W/(m² K). Errors EngineInputError. Source [NETWORK], [WATMUFF1977], [TARP-1983].
 */
export function referenceUValueWM2K(stack: CoverStack): number {
  const { insideAirC, outsideAirC, skyC, windMS, tiltDeg } = REFERENCE_CONDITIONS;
  return solveCoverBalance(stack, {
    insideAirC,
    insideRadiantC: insideAirC,
    outsideAirC,
    skyC,
    groundC: outsideAirC,
    skyViewFrac: (1 + Math.cos((tiltDeg * Math.PI) / 180)) / 2,
    tiltDeg,
    outsideCoefficientWM2K: outsideConvectionWM2K(windMS),
  }).uValueWM2K;
}
