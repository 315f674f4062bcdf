import { requireInRange } from "../errors.ts";

export interface OutsideView {
  /** Shares of what the outer face sees: the sky proper, air near the horizon, and ground. They sum to 1. */
  skyFrac: number;
  horizonFrac: number;
  groundFrac: number;
}

/**
 * Splits the open dome that a face sees into the sky proper and the air near the horizon, which is about as warm as the air.
 * Shape: share of the dome in the view, 0 to 1 (1 flat, 0.5 upright) → shares summing to 1. Throws EngineInputError outside.
 * Source [WALTON1983].
 */
export function outsideView(domeFrac: number): OutsideView {
  requireInRange("domeFrac", domeFrac, 0, 1);
  const skyFrac = domeFrac * Math.sqrt(domeFrac);
  return { skyFrac, horizonFrac: domeFrac - skyFrac, groundFrac: 1 - domeFrac };
}
