import { findZero } from "./find-zero.ts";

/** How far below the outside air a house without any heat may fall under a clear sky, K: the low end of the search. */
const BELOW_OUTSIDE_K = 25;

/**
 * Temperature at which a house settles with the heat it has, never above the set-point. `shortageW(T)` is what is missing
 * to stay at T: losses less gains less installed heat; it rises with T. What is missing at the set-point is known already.
 * Shape: function °C → W, shortage at the set-point W, set-point °C, outside °C, a first guess °C → °C. Source [DOWELL1971].
 */
export function settlesAtC(
  shortageW: (insideTempC: number) => number,
  shortageAtSetpointW: number,
  setpointC: number,
  outdoorTempC: number,
  guessC: number,
): number {
  if (shortageAtSetpointW <= 0) return setpointC;
  const lowestC = Math.min(outdoorTempC, setpointC) - BELOW_OUTSIDE_K;
  return findZero(shortageW, {
    low: lowestC,
    high: setpointC,
    valueAtHigh: shortageAtSetpointW,
    guess: Math.min(setpointC, Math.max(lowestC, guessC)),
  });
}
