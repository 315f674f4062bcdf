import { EngineInputError, requireInRange } from "../errors.ts";
import { solveFlat } from "../numeric/flat.ts";
import { at, createWorkspace, emission, evaluate, nodesOf, type Workspace } from "./cover-equations.ts";
import type { CoverBoundary, CoverStack } from "./cover-types.ts";
import { longwaveExchange } from "./longwave-exchange.ts";

export type { CoverBoundary } from "./cover-types.ts";

export interface CoverBalance {
  /** Inner and outer face of each layer from the room outwards; films have one temperature twice. */
  faceTempsC: number[];
  /** Out of the room, W/m²: by air, by radiation (also straight through films), by condensing water. */
  fromRoomConvectionWM2: number;
  fromRoomRadiationWM2: number;
  fromRoomLatentWM2: number;
  /** All of it. */
  fromRoomWM2: number;
  /** Into the open, W/m². Their sum is what left the room plus the absorbed sun. */
  toOutsideAirWM2: number;
  toSkyWM2: number;
  toGroundWM2: number;
  /** From the room for one kelvin between both airs; 0 where they are equally warm. */
  uValueWM2K: number;
  iterations: number;
  /** Largest imbalance of any node, W/m². */
  residualWM2: number;
}

/** A cover made ready for many moments: the radiation network is solved once. */
export interface CoverSolver {
  solve(boundary: CoverBoundary, startTempsC?: number[]): CoverBalance;
}

const MAX_STEP_K = 10;
const MAX_ITERATIONS = 200;
const CONVERGED_K = 1e-7;
/** Emissivity of a floor under crop, as seen by the cover. From memory, 0.92 to 0.98. */
export const FLOOR_EMISSIVITY = 0.95;

/**
 * Prepares the heat balance of a cover: layers of known radiative properties with air between them.
 *
 * Shapes: layers from the room outwards, one gap between each two. Units W/m², °C, W/(m² K).
 * Valid: 1 to 12 layers; properties of each face add to at most 1; temperatures −150 to 150 °C.
 * Errors: EngineInputError naming the quantity; also when the balance cannot be found within 200 steps.
 * Source [NETWORK]; natural convection [TARP-1983]; air layers [ISO6946].
 */
export function prepareCoverSolver(stack: CoverStack, floorEmissivity = FLOOR_EMISSIVITY): CoverSolver {
  if (stack.gaps.length !== stack.layers.length - 1) {
    throw new EngineInputError({
      quantity: "gaps",
      value: stack.gaps.length,
      reason: "length",
      note: `A cover of ${stack.layers.length} layers has ${stack.layers.length - 1} gaps.`,
    });
  }
  const exchange = longwaveExchange(stack, floorEmissivity);
  const nodes = nodesOf(stack);
  const work = createWorkspace(stack, exchange, nodes);
  return { solve: (boundary, start) => balance(work, boundary, start) };
}

/** One-off form of {@link prepareCoverSolver}. Shapes, units, range, errors and source as there. */
export function solveCoverBalance(
  stack: CoverStack,
  boundary: CoverBoundary,
  floorEmissivity = FLOOR_EMISSIVITY,
): CoverBalance {
  return prepareCoverSolver(stack, floorEmissivity).solve(boundary);
}

function checkBoundary(boundary: CoverBoundary): void {
  for (const name of ["insideAirC", "insideRadiantC", "outsideAirC", "skyC", "groundC"] as const) {
    requireInRange(name, boundary[name], -150, 150, "°C");
  }
  requireInRange("skyViewFrac", boundary.skyViewFrac, 0, 1);
  requireInRange("tiltDeg", boundary.tiltDeg, 0, 180, "°");
  requireInRange("outsideCoefficientWM2K", boundary.outsideCoefficientWM2K, 0, 300, "W/(m²·K)");
}

/** A straight line between both airs. */
function guess({ temps, nodes }: Workspace, boundary: CoverBoundary): void {
  for (let node = 0; node < nodes.count; node += 1) {
    const share = (node + 1) / (nodes.count + 1);
    temps[node] = boundary.insideAirC * (1 - share) + boundary.outsideAirC * share;
  }
}

function startFrom({ temps, nodes }: Workspace, faces: number[]): void {
  nodes.inner.forEach((node, layer) => {
    temps[node] = faces[2 * layer] ?? 0;
    temps[at(nodes.outer, layer)] = faces[2 * layer + 1] ?? 0;
  });
}

function balance(work: Workspace, boundary: CoverBoundary, start?: number[]): CoverBalance {
  checkBoundary(boundary);
  const { temps, residual, jacobian, nodes } = work;
  const cosTilt = Math.cos((boundary.tiltDeg * Math.PI) / 180);
  if (start === undefined) guess(work, boundary);
  else startFrom(work, start);
  for (let iteration = 1; iteration <= MAX_ITERATIONS; iteration += 1) {
    evaluate(work, boundary, cosTilt);
    // After this the residual holds J⁻¹ r, whose negative is the step.
    solveFlat(jacobian, residual, nodes.count);
    let largest = 0;
    for (let node = 0; node < nodes.count; node += 1) {
      const step = -at(residual, node);
      largest = Math.max(largest, Math.abs(step));
      temps[node] = at(temps, node) + Math.min(MAX_STEP_K, Math.max(-MAX_STEP_K, step));
    }
    if (largest < CONVERGED_K) return describe(work, boundary, cosTilt, iteration);
  }
  throw new EngineInputError({
    quantity: "cover",
    value: boundary.outsideAirC,
    reason: "inconsistent",
    note: "The balance of this cover could not be found.",
  });
}

function describe(
  work: Workspace,
  boundary: CoverBoundary,
  cosTilt: number,
  iterations: number,
): CoverBalance {
  evaluate(work, boundary, cosTilt);
  const { exchange, power, temps, nodes, longwave, residual, stack } = work;
  let leavingUp = 0;
  for (let j = 0; j < exchange.emitters; j += 1) leavingUp += at(exchange.leaving, j) * at(power, j);
  let residualWM2 = 0;
  for (let node = 0; node < nodes.count; node += 1)
    residualWM2 = Math.max(residualWM2, Math.abs(at(residual, node)));
  const faceTempsC = stack.layers.flatMap((_, layer) => [
    at(temps, at(nodes.inner, layer)),
    at(temps, at(nodes.outer, layer)),
  ]);
  const fromRoomWM2 = work.room.heat + at(longwave, 0) + work.latent.heat;
  const difference = boundary.insideAirC - boundary.outsideAirC;
  return {
    faceTempsC,
    fromRoomConvectionWM2: work.room.heat,
    fromRoomRadiationWM2: at(longwave, 0),
    fromRoomLatentWM2: work.latent.heat,
    fromRoomWM2,
    toOutsideAirWM2: work.outsideAirWM2,
    toSkyWM2: boundary.skyViewFrac * (leavingUp - emission(boundary.skyC)),
    toGroundWM2: (1 - boundary.skyViewFrac) * (leavingUp - emission(boundary.groundC)),
    uValueWM2K: difference === 0 ? 0 : fromRoomWM2 / difference,
    iterations,
    residualWM2,
  };
}
