import { requireInRange } from "../errors.ts";
import { airLayerLaw, insideLaw } from "./convection-laws.ts";

export const outsideModels = [
  "watmuff",
  "iso6946",
  "mcAdams",
  "garzoliBlackwell",
  "papadakis",
  "bot",
] as const;
export type OutsideModel = (typeof outsideModels)[number];

/** Half width of the speed band over which two branches of a formula are blended, m/s. */
const BLEND_MS = 0.5;

/** Goes from `low` to `high` in a straight line around `breakMS`, so that the formula has no step. */
function blended(windMS: number, breakMS: number, low: number, high: number): number {
  const share = Math.min(1, Math.max(0, (windMS - breakMS + BLEND_MS) / (2 * BLEND_MS)));
  return low * (1 - share) + high * share;
}

const outside: Record<OutsideModel, (windMS: number) => number> = {
  watmuff: (v) => 2.8 + 3 * v,
  iso6946: (v) => 4 + 4 * v,
  mcAdams: (v) => blended(v, 5, 5.7 + 3.8 * v, 6.47 * v ** 0.78),
  garzoliBlackwell: (v) => 7.2 + 3.84 * v,
  papadakis: (v) => 0.95 + 6.76 * v ** 0.49,
  bot: (v) => blended(v, 4, 2.8 + 1.2 * v, 2.5 * v ** 0.8),
};

/**
 * Convective coefficient at the outside of a cover.
 *
 * Units m/s → W/(m² K). Valid 0 to 40 m/s; beyond the range a formula was fitted in it is extended. Branches are blended over
 * ±0.5 m/s. `mcAdams` contains some radiation. Errors EngineInputError.
 * Source [WATMUFF1977] by default; [ISO6946], [MCADAMS1954], [GARZOLI1981], [PAPADAKIS1992], [BOT1983].
 */
export function outsideConvectionWM2K(windMS: number, model: OutsideModel = "watmuff"): number {
  requireInRange("windMS", windMS, 0, 40, "m/s");
  return outside[model](windMS);
}

/**
 * Natural convection at the inside of a surface: warm air under a cold roof stirs, warm air over a cold floor does not.
 *
 * @param differenceK air minus surface, K
 * @param tiltDeg of the outside: 0 flat roof or ceiling, 90 wall
 * Units → W/(m² K). Valid difference −150 to 150 K, tilt 0 to 180°. Errors EngineInputError. Source [TARP-1983].
 */
export function insideConvectionWM2K(differenceK: number, tiltDeg: number): number {
  requireInRange("differenceK", differenceK, -150, 150, "K");
  requireInRange("tiltDeg", tiltDeg, 0, 180, "°");
  const law = { coefficient: 0, slope: 0, branch: 0 };
  insideLaw(law, differenceK, Math.cos((tiltDeg * Math.PI) / 180));
  return law.coefficient;
}

/**
 * Convective coefficient of a closed air layer, radiation left out.
 *
 * @param differenceK lower or inner side minus upper or outer side
 * Units m, K, degrees → W/(m² K). Between flat and upright the coefficient goes with the cosine of the tilt.
 * Valid 1 mm to 1 m. Errors EngineInputError. Source [ISO6946] annex.
 */
export function airLayerConvectionWM2K(thicknessM: number, differenceK: number, tiltDeg: number): number {
  requireInRange("thicknessM", thicknessM, 0.0005, 2, "m");
  requireInRange("tiltDeg", tiltDeg, 0, 180, "°");
  const law = { coefficient: 0, slope: 0, branch: 0 };
  const cosTilt = Math.cos((tiltDeg * Math.PI) / 180);
  airLayerLaw(law, differenceK, cosTilt, 0.025 / thicknessM, 0.09 * thicknessM ** -0.44);
  return law.coefficient;
}
