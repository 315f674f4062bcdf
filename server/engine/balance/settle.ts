import { findZero } from "./find-zero.ts";

/** How far below the outside air a house without any heat may fall under a clear sky, K: the low end of the search. */
const BELOW_OUTSIDE_K = 25;

/**
 * Temperature at which a house settles with the heat it has, never above the set-point. `shortageW(T)` is what is missing
 * to stay at T: losses less gains less installed heat; it rises with T.
 * Shape: function °C → W, set-point °C, outside °C → °C, to 1e-8 K. Source [DOWELL1971].
 */
export function settlesAtC(
  shortageW: (insideTempC: number) => number,
  setpointC: number,
  outdoorTempC: number,
): number {
  if (shortageW(setpointC) <= 0) return setpointC;
  return findZero(shortageW, Math.min(outdoorTempC, setpointC) - BELOW_OUTSIDE_K, setpointC);
}
