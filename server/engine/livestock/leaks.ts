import { requireInRange } from "../errors.ts";

/** How leaks and fans meet: leaks are part of the fans' flow ("larger"), or both push and pull ("rootOfSquares"). */
export type LeakRule = "larger" | "rootOfSquares";

/**
 * Air change of a barn whose fans suck, from the flow of the fans and the leaks wind and warmth would drive alone. Never the plain
 * sum: under suction the leaks take the place of inlet air.
 *
 * Units m³/h → m³/h. Valid 0 to 1e8 m³/h. Errors EngineInputError. Source [LEAKSTREAMS].
 */
export function airWithLeaksM3H(fanM3H: number, leakM3H: number, rule: LeakRule = "larger"): number {
  requireInRange("fanM3H", fanM3H, 0, 1e8, "m³/h");
  requireInRange("leakM3H", leakM3H, 0, 1e8, "m³/h");
  return rule === "larger" ? Math.max(fanM3H, leakM3H) : Math.hypot(fanM3H, leakM3H);
}

/** Exponent of leaks: between 0.5 of holes and 1 of fine cracks. Source [LEAKSTREAMS]. */
const LEAK_EXPONENT = 0.65;

/**
 * Leakage measured at one pressure, at another.
 *
 * Units any flow or air change, Pa → the same. Valid 1 to 200 Pa, exponent 0.5 to 1. Errors EngineInputError. Source [LEAKSTREAMS].
 */
export function leakAtPressure(
  flow: number,
  atPa: number,
  wantedPa: number,
  exponent = LEAK_EXPONENT,
): number {
  requireInRange("flow", flow, 0, 1e8);
  requireInRange("atPa", atPa, 1, 200, "Pa");
  requireInRange("wantedPa", wantedPa, 0.5, 200, "Pa");
  requireInRange("exponent", exponent, 0.5, 1);
  return flow * (wantedPa / atPa) ** exponent;
}

/** What a suction test of a closed house with its test fans says. */
export type Tightness = "tight" | "ordinary" | "leaky";

/** Suction two test fans make in a closed house, Pa: below the first leaky, from the second tight. Source [MARYLAND]. */
const SUCTION_PA = {
  curtain: { leakyBelow: 32, tightFrom: 37 },
  solid: { leakyBelow: 50, tightFrom: 55 },
} as const;

/**
 * Tightness of a house from the suction its test fans reach with every inlet shut.
 *
 * Units Pa → verdict. Valid 0 to 200 Pa. Errors EngineInputError. Source [MARYLAND].
 */
export function tightnessFromSuction(suctionPa: number, walls: "curtain" | "solid"): Tightness {
  requireInRange("suctionPa", suctionPa, 0, 200, "Pa");
  const { leakyBelow, tightFrom } = SUCTION_PA[walls];
  if (suctionPa < leakyBelow) return "leaky";
  return suctionPa >= tightFrom ? "tight" : "ordinary";
}
