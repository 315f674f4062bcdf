import { EngineInputError } from "../errors.ts";
import { evaluate, setMoment, type Workspace } from "./cover-equations.ts";
import { at } from "./cover-network.ts";
import type { CoverBoundary } from "./cover-types.ts";

const MAX_STEP_K = 25;
const MAX_ITERATIONS = 120;
const MAX_HALVINGS = 6;
/** Imbalances below this are rounding, W/m². */
const ROUNDING_WM2 = 1e-9;

/** A straight line between both airs. */
export function guess({ temps, network }: Workspace, boundary: CoverBoundary): void {
  for (let node = 0; node < network.size; node += 1) {
    const share = node < network.faces ? (node + 1) / (network.faces + 1) : 0.5;
    temps[node] = boundary.insideAirC * (1 - share) + boundary.outsideAirC * share;
  }
}

/**
 * Solves the Jacobian for the step, in place. Every column of the negated Jacobian outweighs the rest of itself on the diagonal
 * (heat that leaves one node arrives at others or outside), so no row needs to be exchanged.
 */
function eliminate(a: Float64Array, b: Float64Array, n: number): void {
  for (let column = 0; column < n; column += 1) {
    const lead = at(a, column * n + column);
    for (let row = column + 1; row < n; row += 1) {
      const factor = at(a, row * n + column) / lead;
      if (factor === 0) continue;
      for (let k = column + 1; k < n; k += 1)
        a[row * n + k] = at(a, row * n + k) - factor * at(a, column * n + k);
      b[row] = at(b, row) - factor * at(b, column);
    }
  }
  for (let row = n - 1; row >= 0; row -= 1) {
    let value = at(b, row);
    for (let k = row + 1; k < n; k += 1) value -= at(a, row * n + k) * at(b, k);
    b[row] = value / at(a, row * n + row);
  }
}

function imbalance({ residual, network }: Workspace): number {
  let sum = 0;
  for (let node = 0; node < network.size; node += 1) sum += Math.abs(at(residual, node));
  return sum;
}

/** Takes the step that now stands in the residual, shortened where it is too long; returns its longest part. */
function step({ temps, previous, residual, network }: Workspace): number {
  let longest = 0;
  for (let node = 0; node < network.size; node += 1) {
    const size = Math.abs(at(residual, node));
    // A comparison that is false for NaN would hide it.
    if (!(size <= longest)) longest = size;
  }
  const scale = longest > MAX_STEP_K ? MAX_STEP_K / longest : 1;
  for (let node = 0; node < network.size; node += 1) {
    previous[node] = at(temps, node);
    temps[node] = at(temps, node) - scale * at(residual, node);
  }
  return longest;
}

function halfWayBack({ temps, previous, network }: Workspace): void {
  for (let node = 0; node < network.size; node += 1) temps[node] = (at(temps, node) + at(previous, node)) / 2;
}

/** When a step is short enough: `toleranceK` where it kept to one law of convection, `crossingK` where it came to another. */
export interface Precision {
  toleranceK: number;
  crossingK: number;
}

/**
 * Newton's method from the temperatures in the workspace until a step is short enough; the workspace is then evaluated at the
 * last temperatures. The sum of all imbalances must fall from step to step; where it does not, half of the step is taken back,
 * a few times at most, since where a law changes its branch the sum may have to rise.
 *
 * Shapes: workspace, moment, precision K → number of steps. Errors EngineInputError when no balance is found. Source [NETWORK].
 */
export function balanceTemps(work: Workspace, boundary: CoverBoundary, precision: Precision): number {
  setMoment(work, boundary);
  evaluate(work, boundary);
  let before = imbalance(work);
  for (let iteration = 1; iteration <= MAX_ITERATIONS; iteration += 1) {
    const regime = work.regime;
    eliminate(work.jacobian, work.residual, work.network.size);
    const longest = step(work);
    evaluate(work, boundary);
    const stayed = work.regime === regime;
    if (longest < (stayed ? precision.toleranceK : precision.crossingK)) return iteration;
    let now = imbalance(work);
    for (let half = 0; half < MAX_HALVINGS && now > before && now > ROUNDING_WM2; half += 1) {
      halfWayBack(work);
      evaluate(work, boundary);
      now = imbalance(work);
    }
    before = now;
  }
  throw new EngineInputError({
    quantity: "cover",
    value: boundary.outsideAirC,
    reason: "inconsistent",
    note: "The balance of this cover could not be found.",
  });
}
