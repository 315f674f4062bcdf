import type { OutsideHour, SurfaceFlux } from "./surface-model.ts";
import {
  outsideFilmWM2K,
  skyShareOfTypedLossFrac,
  TABLE_WIND_MS,
  uValueAtWindWM2K,
} from "./typed-u-value.ts";

/** Inside film of a U-value, for the temperature of the inner face, W/(m² K): 1/0.13. Source [ISO6946]. */
const INSIDE_FILM_WM2K = 1 / 0.13;

/** How a U-value given as one number is used. */
export type TypedRule = "asTyped" | "atWind";

/**
 * Heat through 1 m² of a cover given as one U-value, with faces from its two films.
 * Design nights use the value as it is typed, as tables are meant to be used (`asTyped`); the hours of a year bring it to the
 * wind of the hour (`atWind`).
 * Shape: W/(m² K), inside °C, hour, view of the sky 0 to 1, rule → W/m² and faces. Source [ASHRAEAPP], [ISO6946].
 */
export function typedFlux(
  uValueWM2K: number,
  insideTempC: number,
  outside: OutsideHour,
  skyViewFrac: number,
  rule: TypedRule,
): SurfaceFlux {
  const windMS = rule === "asTyped" ? TABLE_WIND_MS : outside.windMS;
  const uWM2K = uValueAtWindWM2K(uValueWM2K, windMS);
  const differenceK = insideTempC - outside.airTempC;
  const lossWM2 = uWM2K * differenceK;
  const innerDropK = Math.min(Math.abs(lossWM2) / INSIDE_FILM_WM2K, 0.9 * Math.abs(differenceK));
  const outerDropK = Math.min(
    Math.abs(lossWM2) / outsideFilmWM2K(windMS),
    Math.abs(differenceK) - innerDropK,
  );
  const sign = Math.sign(differenceK);
  return {
    lossWM2,
    toSkyWM2: lossWM2 * skyShareOfTypedLossFrac(windMS, skyViewFrac),
    faceTempsC: [insideTempC - sign * innerDropK, outside.airTempC + sign * outerDropK],
  };
}

/**
 * U-value of a typed cover behind a closed screen: the screen saves its share where it covers.
 * Shape: W/(m² K), saving 0 to 0.95, covered share 0 to 1 → W/(m² K). Source [SCREENTABLE].
 */
export function screenedUValueWM2K(uValueWM2K: number, savingFrac: number, coveredFrac: number): number {
  return uValueWM2K * (1 - savingFrac * coveredFrac);
}
