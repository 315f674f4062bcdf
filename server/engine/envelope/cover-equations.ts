import { saturationPressurePa } from "../air/saturation.ts";
import { STEFAN_BOLTZMANN_WM2K4, ZERO_CELSIUS_K } from "../constants.ts";
import { airLayerLaw, insideLaw, type Law } from "./convection-laws.ts";
import { at, type CoverNetwork } from "./cover-network.ts";
import type { CoverBoundary } from "./cover-types.ts";

/** Vapour that reaches a cold face by the Lewis relation, kg/(s m² Pa) for one W/(m² K) of convection. From memory, theory 6.4 to 6.9e-9. */
export const LEWIS_KGSM2PA = 6.4e-9;
export const EVAPORATION_JKG = 2.45e6;

/** Everything a solve needs, made once per cover: the inner loop of a year allocates nothing. */
export interface Workspace {
  network: CoverNetwork;
  temps: Float64Array;
  previous: Float64Array;
  /** σT⁴ of every face. */
  power: Float64Array;
  /** What does not change while the temperatures are sought: radiation of room and outside, and sun. */
  given: Float64Array;
  residual: Float64Array;
  /** Row after row. */
  jacobian: Float64Array;
  law: Law;
  /** Tells by which laws of convection the last evaluation went; another number, other laws. */
  regime: number;
  roomPowerWM2: number;
  outsidePowerWM2: number;
  cosTilt: number;
  roomAirWM2: number;
  latentWM2: number;
  outsideAirWM2: number;
}

/** A workspace for one cover. */
export function createWorkspace(network: CoverNetwork): Workspace {
  const { size, faces } = network;
  return {
    network,
    temps: new Float64Array(size),
    previous: new Float64Array(size),
    power: new Float64Array(faces),
    given: new Float64Array(faces),
    residual: new Float64Array(size),
    jacobian: new Float64Array(size * size),
    law: { coefficient: 0, slope: 0, branch: 0 },
    regime: 0,
    roomPowerWM2: 0,
    outsidePowerWM2: 0,
    cosTilt: 1,
    roomAirWM2: 0,
    latentWM2: 0,
    outsideAirWM2: 0,
  };
}

/** What a black face sends out, W/m². */
export function emission(tempC: number): number {
  const square = (tempC + ZERO_CELSIUS_K) ** 2;
  return STEFAN_BOLTZMANN_WM2K4 * square * square;
}

/** Takes in the moment: what room, sky, ground and sun send. */
export function setMoment(work: Workspace, boundary: CoverBoundary): void {
  const { network, given } = work;
  const sky = boundary.skyViewFrac;
  work.cosTilt = Math.cos((boundary.tiltDeg * Math.PI) / 180);
  work.roomPowerWM2 = emission(boundary.insideRadiantC);
  work.outsidePowerWM2 = sky * emission(boundary.skyC) + (1 - sky) * emission(boundary.groundC);
  for (let face = 0; face < network.faces; face += 1) {
    given[face] =
      at(network.intoFaceFromRoom, face) * work.roomPowerWM2 +
      at(network.intoFaceFromOutside, face) * work.outsidePowerWM2;
  }
  const sun = boundary.absorbedSolarWM2;
  if (sun === undefined) return;
  for (let layer = 0; layer < network.layers; layer += 1) {
    const half = (sun[layer] ?? 0) / 2;
    const inner = at(network.inner, layer);
    const outer = at(network.outer, layer);
    given[inner] = at(given, inner) + half;
    given[outer] = at(given, outer) + half;
  }
}

/** Fills residual and Jacobian for the temperatures in the workspace. */
export function evaluate(work: Workspace, boundary: CoverBoundary): void {
  work.regime = 0;
  radiate(work);
  insideFace(work, boundary);
  for (let gap = 0; gap < work.network.layers - 1; gap += 1) crossGap(work, boundary, gap);
  conduct(work);
  outsideFace(work, boundary);
}

/** Longwave exchange of all faces and what is given; overwrites residual and Jacobian. */
function radiate({ network, temps, power, given, residual, jacobian }: Workspace): void {
  const { faces, size, intoFace } = network;
  if (size > faces) {
    residual.fill(0);
    jacobian.fill(0);
  }
  for (let face = 0; face < faces; face += 1) {
    power[face] = emission(at(temps, face));
    residual[face] = at(given, face);
  }
  for (let j = 0; j < faces; j += 1) {
    const sent = at(power, j);
    const slope = (4 * sent) / (at(temps, j) + ZERO_CELSIUS_K);
    for (let i = 0; i < faces; i += 1) {
      const share = at(intoFace, i * faces + j);
      residual[i] = at(residual, i) + share * sent;
      jacobian[i * size + j] = share * slope;
    }
  }
}

/** Heat that enters a node from something whose temperature is given; the slope is that of the heat with the node's. */
function enter({ residual, jacobian, network }: Workspace, node: number, heat: number, slope: number): void {
  const diagonal = node * (network.size + 1);
  residual[node] = at(residual, node) + heat;
  jacobian[diagonal] = at(jacobian, diagonal) + slope;
}

/** Moves heat from one node to another; the slope is that of the heat with their difference. */
function move(work: Workspace, from: number, to: number, heat: number, slope: number): void {
  const { residual, jacobian } = work;
  const { size } = work.network;
  const rowFrom = from * size;
  const rowTo = to * size;
  residual[from] = at(residual, from) - heat;
  residual[to] = at(residual, to) + heat;
  jacobian[rowFrom + from] = at(jacobian, rowFrom + from) - slope;
  jacobian[rowFrom + to] = at(jacobian, rowFrom + to) + slope;
  jacobian[rowTo + to] = at(jacobian, rowTo + to) - slope;
  jacobian[rowTo + from] = at(jacobian, rowTo + from) + slope;
}

/** Room air and condensing water on the innermost face. */
function insideFace(work: Workspace, boundary: CoverBoundary): void {
  const { law, temps } = work;
  const faceC = at(temps, 0);
  const difference = boundary.insideAirC - faceC;
  const fixed = boundary.insideCoefficientWM2K;
  if (fixed === undefined) insideLaw(law, difference, work.cosTilt);
  else setFixed(law, fixed);
  work.regime += law.branch;
  work.roomAirWM2 = law.coefficient * difference;
  enter(work, 0, work.roomAirWM2, -(law.coefficient + law.slope * difference));
  work.latentWM2 = 0;
  if (boundary.vapourPressurePa !== undefined) condense(work, boundary.vapourPressurePa, faceC);
}

function condense(work: Workspace, vapourPressurePa: number, faceC: number): void {
  const saturated = saturationPressurePa(faceC);
  const excess = vapourPressurePa - saturated;
  if (excess <= 0) return;
  const perCoefficient = EVAPORATION_JKG * LEWIS_KGSM2PA;
  const steepness = (saturationPressurePa(faceC + 0.01) - saturationPressurePa(faceC - 0.01)) / 0.02;
  const { coefficient, slope } = work.law;
  work.latentWM2 = perCoefficient * coefficient * excess;
  work.regime += 1 << 30;
  enter(work, 0, work.latentWM2, -perCoefficient * (coefficient * steepness + Math.max(0, slope) * excess));
}

function setFixed(law: Law, coefficient: number): void {
  law.coefficient = coefficient;
  law.slope = 0;
  law.branch = 0;
}

/** The law of a gap for a difference from face to face. */
function gapLaw(work: Workspace, gap: number, differenceK: number): Law {
  const { network, law } = work;
  const fixed = at(network.gapFixedWM2K, gap);
  if (Number.isNaN(fixed)) {
    const conduction = at(network.gapConductionWM2K, gap);
    airLayerLaw(law, differenceK, work.cosTilt, conduction, at(network.gapDownFactor, gap));
  } else setFixed(law, fixed);
  work.regime = 7 * work.regime + law.branch;
  return law;
}

/** From the outer face of one layer to the inner face of the next, straight or by way of the air that flows in the gap. */
function crossGap(work: Workspace, boundary: CoverBoundary, gap: number): void {
  const { network } = work;
  const below = at(network.outer, gap);
  const above = at(network.inner, gap + 1);
  const air = at(network.gapAir, gap);
  if (air < 0) {
    throughGap(work, gap, below, above, 1);
    return;
  }
  // Half of the gap's resistance lies on either side of its air, and each half is driven as if it were the whole.
  throughGap(work, gap, below, air, 2);
  throughGap(work, gap, air, above, 2);
  const leak = at(network.gapLeakWM2K, gap);
  const vent = at(network.gapVentWM2K, gap);
  if (leak > 0) leakIn(work, boundary, gap, air, leak);
  if (vent > 0) enter(work, air, vent * (boundary.outsideAirC - at(work.temps, air)), -vent);
}

function throughGap(work: Workspace, gap: number, from: number, to: number, parts: number): void {
  const { temps } = work;
  const difference = parts * (at(temps, from) - at(temps, to));
  const { coefficient, slope } = gapLaw(work, gap, difference);
  move(work, from, to, coefficient * difference, parts * (coefficient + slope * difference));
}

/** Air out of the space below the gap: the room, or the gap further in. Each flow returns the same way. */
function leakIn(work: Workspace, boundary: CoverBoundary, gap: number, air: number, leak: number): void {
  const { network, temps } = work;
  const airC = at(temps, air);
  if (gap > 0) {
    const further = at(network.gapAir, gap - 1);
    move(work, further, air, leak * (at(temps, further) - airC), leak);
    return;
  }
  const heat = leak * (boundary.insideAirC - airC);
  work.roomAirWM2 += heat;
  enter(work, air, heat, -leak);
}

function conduct(work: Workspace): void {
  const { network, temps } = work;
  for (let layer = 0; layer < network.layers; layer += 1) {
    const conductance = at(network.layerWM2K, layer);
    if (conductance === 0) continue;
    const inner = at(network.inner, layer);
    const outer = at(network.outer, layer);
    move(work, inner, outer, conductance * (at(temps, inner) - at(temps, outer)), conductance);
  }
}

function outsideFace(work: Workspace, boundary: CoverBoundary): void {
  const { network, temps } = work;
  const last = network.faces - 1;
  const coefficient = boundary.outsideCoefficientWM2K;
  const heat = coefficient * (at(temps, last) - boundary.outsideAirC);
  enter(work, last, -heat, -coefficient);
  work.outsideAirWM2 = heat;
  for (let gap = 0; gap < network.layers - 1; gap += 1) {
    const vent = at(network.gapVentWM2K, gap);
    if (vent > 0) work.outsideAirWM2 += vent * (at(temps, at(network.gapAir, gap)) - boundary.outsideAirC);
  }
}
