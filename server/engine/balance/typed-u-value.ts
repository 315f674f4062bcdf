import { requireInRange } from "../errors.ts";

/** Wind at which whole-cover U-values are tabulated, m/s. Source [ASHRAEAPP]. */
export const TABLE_WIND_MS = 6.7;
/** Radiative part of the outside film, W/(m² K). Source [ISO6946]. */
const FILM_RADIATION_WM2K = 4.16;

/**
 * Outside film of a plain surface: convection 4 + 4v and radiation.
 * Shape: m/s (0 to 40) → W/(m² K). Throws EngineInputError outside. Source [ISO6946].
 */
export function outsideFilmWM2K(windMS: number): number {
  requireInRange("windMS", windMS, 0, 40, "m/s");
  return 4 + 4 * windMS + FILM_RADIATION_WM2K;
}

/**
 * A whole-cover U-value brought from the wind it was tabulated at to another wind, by exchanging the outside film.
 * Shape: W/(m² K) (0.01 to 15), m/s, m/s → W/(m² K). Throws EngineInputError outside. Source [ISO6946], [ASHRAEAPP].
 */
export function uValueAtWindWM2K(uValueWM2K: number, windMS: number, tableWindMS = TABLE_WIND_MS): number {
  requireInRange("uValueWM2K", uValueWM2K, 0.01, 15, "W/(m² K)");
  return 1 / (1 / uValueWM2K - 1 / outsideFilmWM2K(tableWindMS) + 1 / outsideFilmWM2K(windMS));
}

/**
 * How much of the loss through a cover given as one U-value is counted as radiation to the sky: the radiative share of its
 * outside film times the share of the view that the sky proper takes.
 * Shape: wind m/s, view 0 to 1 → share 0 to 1. Throws EngineInputError outside. Source [ISO6946], [WALTON1983].
 */
export function skyShareOfTypedLossFrac(windMS: number, skyViewFrac: number): number {
  requireInRange("skyViewFrac", skyViewFrac, 0, 1);
  return (FILM_RADIATION_WM2K / outsideFilmWM2K(windMS)) * skyViewFrac;
}
