import { ZERO_CELSIUS_K } from "../constants.ts";
import { requireInRange } from "../errors.ts";

/** Coefficients of ln(p) over ice, −100 to 0 °C. Source [ASHRAE-F17] equation 5. */
const ICE = [
  -5.6745359e3, 6.3925247, -9.677843e-3, 6.2215701e-7, 2.0747825e-9, -9.484024e-13, 4.1635019,
] as const;
/** Coefficients of ln(p) over water, 0 to 200 °C. Source [ASHRAE-F17] equation 6. */
const WATER = [-5.8002206e3, 1.3914993, -4.8640239e-2, 4.1764768e-5, -1.4452093e-8, 0, 6.5459673] as const;

/** Below this temperature the air is saturated over ice, °C. */
const TRIPLE_POINT_C = 0.01;

function logPressure(kelvin: number, c: typeof ICE | typeof WATER): number {
  return (
    c[0] / kelvin +
    c[1] +
    c[2] * kelvin +
    c[3] * kelvin ** 2 +
    c[4] * kelvin ** 3 +
    c[5] * kelvin ** 4 +
    c[6] * Math.log(kelvin)
  );
}

/**
 * Pressure of saturated water vapour, over ice below 0.01 °C and over water above.
 *
 * Units °C → Pa. Valid −100 to 200 °C. Errors EngineInputError outside.
 * Source [ASHRAE-F17], Hyland and Wexler's fit.
 */
export function saturationPressurePa(tempC: number): number {
  requireInRange("tempC", tempC, -100, 200, "°C");
  return Math.exp(logPressure(tempC + ZERO_CELSIUS_K, tempC <= TRIPLE_POINT_C ? ICE : WATER));
}

/**
 * Temperature at which air of this vapour pressure is saturated (frost point below 0.01 °C): the inverse of
 * {@link saturationPressurePa}, by Newton steps on the logarithm, to 1e-9 K.
 *
 * Units Pa → °C. Valid 0.002 Pa to 1.5 MPa. Errors EngineInputError outside. Source [ASHRAE-F17].
 */
export function dewPointFromPressureC(vapourPressurePa: number): number {
  requireInRange("vapourPressurePa", vapourPressurePa, 0.002, 1.5e6, "Pa");
  const target = Math.log(vapourPressurePa);
  // Magnus-type first guess; Newton on ln p is then quadratic, since ln p is nearly linear in 1/T.
  const guess = Math.log(vapourPressurePa / 611.2);
  let tempC = (243.12 * guess) / (17.62 - guess);
  for (let step = 0; step < 60; step += 1) {
    const bounded = Math.min(199.9, Math.max(-99.9, tempC));
    const kelvin = bounded + ZERO_CELSIUS_K;
    const c = bounded <= TRIPLE_POINT_C ? ICE : WATER;
    const slope =
      -c[0] / kelvin ** 2 +
      c[2] +
      2 * c[3] * kelvin +
      3 * c[4] * kelvin ** 2 +
      4 * c[5] * kelvin ** 3 +
      c[6] / kelvin;
    const change = (target - logPressure(kelvin, c)) / slope;
    tempC = bounded + change;
    if (Math.abs(change) < 1e-10) break;
  }
  return tempC;
}
