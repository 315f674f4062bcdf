import { requireInRange } from "../errors.ts";

export interface OutsideView {
  /** Shares of what the outer face sees: the sky proper, air near the horizon, and ground. They sum to 1. */
  skyFrac: number;
  horizonFrac: number;
  groundFrac: number;
}

/**
 * What a tilted face sees: sky proper, near-horizon air and ground. `opening` below 1 stands for slopes that face each other
 * over a gutter; the rest of their view is counted as ground, which is about as warm as the air.
 * Shape: tilt 0 (flat) to 180°, opening 0.3 to 1 → shares summing to 1. Throws EngineInputError outside. Source [WALTON1983].
 */
export function outsideView(tiltDeg: number, opening = 1): OutsideView {
  requireInRange("tiltDeg", tiltDeg, 0, 180, "°");
  requireInRange("opening", opening, 0.3, 1);
  const dome = ((1 + Math.cos((tiltDeg * Math.PI) / 180)) / 2) * opening;
  const skyFrac = dome * Math.sqrt(dome);
  return { skyFrac, horizonFrac: dome - skyFrac, groundFrac: 1 - dome };
}
