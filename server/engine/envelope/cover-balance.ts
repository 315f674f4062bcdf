import { saturationPressurePa } from "../air/saturation.ts";
import { requireInRange } from "../errors.ts";
import { createWorkspace, emission, type Workspace } from "./cover-equations.ts";
import { at, coverNetwork } from "./cover-network.ts";
import { balanceTemps, guess } from "./cover-newton.ts";
import type { CoverBalance, CoverBoundary, CoverFlows, CoverStack } from "./cover-types.ts";

export type { CoverBalance, CoverBoundary, CoverFlows } from "./cover-types.ts";

/** A cover made ready for many moments: the radiation network is solved once. */
export interface CoverSolver {
  /** The full balance, exact to rounding; face temperatures of an earlier answer may be given as a start. */
  solve(boundary: CoverBoundary, startTempsC?: number[]): CoverBalance;
  /**
   * The quick way for a run of hours: starts where the last call of either kind ended, is exact to 0.001 K, and returns the
   * same object every time.
   */
  step(boundary: CoverBoundary): CoverFlows;
}

/** A step this short is followed by none that could be told from rounding. */
const EXACT = { toleranceK: 1e-9, crossingK: 1e-9 };
/**
 * What is left after a step goes with its square, at most about 0.3 K per K²; where a law of convection gives way to another, it
 * is up to a fifth of the step.
 */
const QUICK = { toleranceK: 0.02, crossingK: 2e-3 };
/** Emissivity of a floor under crop, as seen by the cover. From memory, 0.92 to 0.98. */
export const FLOOR_EMISSIVITY = 0.95;

/**
 * Prepares the heat balance of a cover: layers of known radiative properties with air between them.
 *
 * Shapes: layers from the room outwards, one gap between each two. Units W/m², °C, W/(m² K).
 * Valid: 1 to 12 layers; properties of each face add to at most 1; temperatures −150 to 150 °C.
 * Errors: EngineInputError naming the quantity; also when the balance cannot be found.
 * Source [NETWORK]; natural convection [TARP-1983]; air layers [ISO6946].
 */
export function prepareCoverSolver(stack: CoverStack, floorEmissivity = FLOOR_EMISSIVITY): CoverSolver {
  const work = createWorkspace(coverNetwork(stack, floorEmissivity));
  const flows: CoverFlows = {
    fromRoomWM2: 0,
    toOutsideAirWM2: 0,
    toSkyWM2: 0,
    toGroundWM2: 0,
    innerFaceC: 0,
    outerFaceC: 0,
    iterations: 0,
  };
  let started = false;
  return {
    solve(boundary, start) {
      checkBoundary(boundary);
      guess(work, boundary);
      if (start !== undefined) startFrom(work, start);
      started = false;
      const iterations = balanceTemps(work, boundary, EXACT);
      started = true;
      return describe(work, boundary, iterations);
    },
    step(boundary) {
      checkBoundary(boundary);
      if (!started) guess(work, boundary);
      started = false;
      const iterations = balanceTemps(work, boundary, QUICK);
      started = true;
      return describeFlows(work, boundary, iterations, flows);
    },
  };
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
  requireInRange("insideAirC", boundary.insideAirC, -150, 150, "°C");
  requireInRange("insideRadiantC", boundary.insideRadiantC, -150, 150, "°C");
  requireInRange("outsideAirC", boundary.outsideAirC, -150, 150, "°C");
  requireInRange("skyC", boundary.skyC, -150, 150, "°C");
  requireInRange("groundC", boundary.groundC, -150, 150, "°C");
  requireInRange("skyViewFrac", boundary.skyViewFrac, 0, 1);
  requireInRange("tiltDeg", boundary.tiltDeg, 0, 180, "°");
  requireInRange("outsideCoefficientWM2K", boundary.outsideCoefficientWM2K, 0, 300, "W/(m²·K)");
  if (boundary.insideCoefficientWM2K !== undefined)
    requireInRange("insideCoefficientWM2K", boundary.insideCoefficientWM2K, 0, 300, "W/(m²·K)");
  if (boundary.vapourPressurePa !== undefined)
    requireInRange("vapourPressurePa", boundary.vapourPressurePa, 0, mostVapourPa(boundary.insideAirC), "Pa");
  const sun = boundary.absorbedSolarWM2;
  if (sun === undefined) return;
  for (let layer = 0; layer < sun.length; layer += 1)
    requireInRange("absorbedSolarWM2", at(sun, layer), 0, 1500, "W/m²", layer);
}

/** Air holds no more vapour than at saturation; a little is allowed for rounding. */
const mostVapourPa = (insideAirC: number) => 1.001 * saturationPressurePa(insideAirC);

function startFrom({ temps, network }: Workspace, faces: number[]): void {
  for (let layer = 0; layer < network.layers; layer += 1) {
    temps[at(network.inner, layer)] = faces[2 * layer] ?? 0;
    temps[at(network.outer, layer)] = faces[2 * layer + 1] ?? 0;
  }
  for (let gap = 0; gap < network.layers - 1; gap += 1) {
    const air = at(network.gapAir, gap);
    if (air >= 0) temps[air] = ((faces[2 * gap + 1] ?? 0) + (faces[2 * gap + 2] ?? 0)) / 2;
  }
}

/** A row of the network over the faces, with room and outside. */
function over({ network, power, roomPowerWM2, outsidePowerWM2 }: Workspace, row: Float64Array): number {
  const { faces } = network;
  let sum = at(row, faces) * roomPowerWM2 + at(row, faces + 1) * outsidePowerWM2;
  for (let face = 0; face < faces; face += 1) sum += at(row, face) * at(power, face);
  return sum;
}

function describe(work: Workspace, boundary: CoverBoundary, iterations: number): CoverBalance {
  const { network, temps, residual } = work;
  const radiation = over(work, network.outOfRoom);
  const rising = over(work, network.rising);
  const fromRoomWM2 = work.roomAirWM2 + radiation + work.latentWM2;
  const difference = boundary.insideAirC - boundary.outsideAirC;
  const faceTempsC: number[] = [];
  for (let layer = 0; layer < network.layers; layer += 1)
    faceTempsC.push(at(temps, at(network.inner, layer)), at(temps, at(network.outer, layer)));
  return {
    faceTempsC,
    fromRoomConvectionWM2: work.roomAirWM2,
    fromRoomRadiationWM2: radiation,
    fromRoomLatentWM2: work.latentWM2,
    fromRoomWM2,
    straightThroughWM2: at(network.rising, network.faces) * (work.roomPowerWM2 - work.outsidePowerWM2),
    toOutsideAirWM2: work.outsideAirWM2,
    toSkyWM2: boundary.skyViewFrac * (rising - emission(boundary.skyC)),
    toGroundWM2: (1 - boundary.skyViewFrac) * (rising - emission(boundary.groundC)),
    uValueWM2K: difference === 0 ? 0 : fromRoomWM2 / difference,
    iterations,
    residualWM2: residual.reduce((largest, value) => Math.max(largest, Math.abs(value)), 0),
  };
}

function describeFlows(
  work: Workspace,
  boundary: CoverBoundary,
  iterations: number,
  flows: CoverFlows,
): CoverFlows {
  const { network, temps, power } = work;
  flows.fromRoomWM2 = work.roomAirWM2 + over(work, network.outOfRoom) + work.latentWM2;
  const rising = over(work, network.rising);
  flows.toOutsideAirWM2 = work.outsideAirWM2;
  flows.toSkyWM2 = boundary.skyViewFrac * (rising - emission(boundary.skyC));
  flows.toGroundWM2 = (1 - boundary.skyViewFrac) * (rising - emission(boundary.groundC));
  flows.innerFaceC = at(temps, 0);
  flows.outerFaceC = at(temps, power.length - 1);
  flows.iterations = iterations;
  return flows;
}
