import { saturationPressurePa } from "../air/saturation.ts";
import { STEFAN_BOLTZMANN_WM2K4, ZERO_CELSIUS_K } from "../constants.ts";
import { EngineInputError, requireInRange } from "../errors.ts";
import { solveDense } from "../numeric/dense.ts";
import { airLayerCoefficient, insideCoefficient } from "./convection.ts";
import type { CoverStack } from "./cover-types.ts";
import { type LongwaveExchange, longwaveExchange } from "./longwave-exchange.ts";

/** What stands on both sides of a cover at one moment. */
export interface CoverBoundary {
  insideAirC: number;
  /** Temperature of floor, crop or stock as seen from the cover. */
  insideRadiantC: number;
  outsideAirC: number;
  skyC: number;
  /** Ground and surroundings as seen from outside. */
  groundC: number;
  skyViewFrac: number;
  tiltDeg: number;
  /** Convective, W/(m² K). */
  outsideCoefficientWM2K: number;
  /** Convective; left out, natural convection by tilt. */
  insideCoefficientWM2K?: number;
  /** Sun absorbed in each layer, W/m²; left out, none. */
  absorbedSolarWM2?: number[];
  /** Vapour pressure of the room; given, water that condenses on the inner face gives its heat to it. */
  vapourPressurePa?: number;
}

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
const MAX_ITERATIONS = 60;
const CONVERGED_K = 1e-7;
/** Vapour that reaches a cold face by the Lewis relation, kg/(s m² Pa) for one W/(m² K) of convection. From memory, theory 6.4 to 6.9e-9. */
const LEWIS = 6.4e-9;
const EVAPORATION_JKG = 2.45e6;
/** Emissivity of a floor under crop, as seen by the cover. From memory, 0.92 to 0.98. */
export const FLOOR_EMISSIVITY = 0.95;

/**
 * Prepares the heat balance of a cover: layers of known radiative properties with air between them.
 *
 * Shapes: layers from the room outwards, one gap between each two. Units W/m², °C, W/(m² K).
 * Valid: 1 to 12 layers; properties of each face add to at most 1; temperatures −150 to 150 °C.
 * Errors: EngineInputError naming the quantity; also when the balance cannot be found within 60 steps.
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
  return { solve: (boundary, start) => balance(stack, exchange, nodes, boundary, start) };
}

/** One-off form of {@link prepareCoverSolver}. Shapes, units, range, errors and source as there. */
export function solveCoverBalance(
  stack: CoverStack,
  boundary: CoverBoundary,
  floorEmissivity = FLOOR_EMISSIVITY,
): CoverBalance {
  return prepareCoverSolver(stack, floorEmissivity).solve(boundary);
}

/** Which unknown stands for the inner and the outer face of each layer. */
interface Nodes {
  inner: number[];
  outer: number[];
  count: number;
}

function nodesOf(stack: CoverStack): Nodes {
  const inner: number[] = [];
  const outer: number[] = [];
  let count = 0;
  for (const layer of stack.layers) {
    inner.push(count);
    if (layer.resistanceM2KW > 0) count += 1;
    outer.push(count);
    count += 1;
  }
  return { inner, outer, count };
}

function checkBoundary(boundary: CoverBoundary): void {
  for (const name of ["insideAirC", "insideRadiantC", "outsideAirC", "skyC", "groundC"] as const) {
    requireInRange(name, boundary[name], -150, 150, "°C");
  }
  requireInRange("skyViewFrac", boundary.skyViewFrac, 0, 1);
  requireInRange("tiltDeg", boundary.tiltDeg, 0, 180, "°");
  requireInRange("outsideCoefficientWM2K", boundary.outsideCoefficientWM2K, 0, 300, "W/(m²·K)");
}

const emission = (tempC: number) => STEFAN_BOLTZMANN_WM2K4 * (tempC + ZERO_CELSIUS_K) ** 4;
const emissionSlope = (tempC: number) => 4 * STEFAN_BOLTZMANN_WM2K4 * (tempC + ZERO_CELSIUS_K) ** 3;

/** Heat by air across one gap or film, W/m², and its slope with the difference. */
interface AirFlow {
  heat: number;
  slope: number;
}

function roomAir(boundary: CoverBoundary, faceC: number, cosTilt: number): AirFlow & { coefficient: number } {
  const difference = boundary.insideAirC - faceC;
  const given = boundary.insideCoefficientWM2K;
  const coefficient = given ?? insideCoefficient(difference, cosTilt);
  // The natural law goes with the power 4/3 of the difference.
  return {
    heat: coefficient * difference,
    slope: given === undefined ? (4 / 3) * coefficient : coefficient,
    coefficient,
  };
}

function gapAir(stack: CoverStack, gap: number, lowerC: number, upperC: number, cosTilt: number): AirFlow {
  const { kind, thicknessM, coefficientWM2K, airLeakageM3HM2 } = stack.gaps[
    gap
  ] as CoverStack["gaps"][number];
  const difference = lowerC - upperC;
  const base = kind === "fixed" ? coefficientWM2K : airLayerCoefficient(thicknessM, difference, cosTilt);
  const leak = 0.3353 * airLeakageM3HM2;
  const stillGrows = kind === "still" && Math.abs(difference) > 5 && base > 0.025 / thicknessM;
  return { heat: (base + leak) * difference, slope: (stillGrows ? (4 / 3) * base : base) + leak };
}

interface Equations {
  residual: Float64Array;
  jacobian: Float64Array[];
  room: AirFlow & { coefficient: number };
  longwave: Float64Array;
  latent: number;
  outsideAir: number;
}

function evaluate(
  stack: CoverStack,
  exchange: LongwaveExchange,
  nodes: Nodes,
  boundary: CoverBoundary,
  temps: Float64Array,
  cosTilt: number,
): Equations {
  const count = stack.layers.length;
  const power = emitterPowers(exchange, nodes, boundary, temps);
  const longwave = new Float64Array(count + 1);
  for (let gap = 0; gap <= count; gap += 1) {
    const line = exchange.flow[gap] as Float64Array;
    let sum = 0;
    for (let j = 0; j < line.length; j += 1) sum += (line[j] as number) * (power[j] as number);
    longwave[gap] = sum;
  }
  const residual = new Float64Array(nodes.count);
  const jacobian = Array.from({ length: nodes.count }, () => new Float64Array(nodes.count));
  const at = (node: number) => temps[node] as number;
  const gain = (node: number, heat: number) => {
    residual[node] = (residual[node] as number) + heat;
  };
  const slope = (node: number, by: number, value: number) => {
    const line = jacobian[node] as Float64Array;
    line[by] = (line[by] as number) + value;
  };
  const first = nodes.inner[0] as number;
  const room = roomAir(boundary, at(first), cosTilt);
  gain(first, room.heat);
  slope(first, first, -room.slope);
  const latent = latentHeat(boundary, at(first), room.coefficient);
  gain(first, latent.heat);
  slope(first, first, -latent.slope);
  for (let layer = 0; layer < count; layer += 1) {
    const inner = nodes.inner[layer] as number;
    const outer = nodes.outer[layer] as number;
    addLongwave(exchange, nodes, longwave, layer, temps, gain, slope);
    const sun = (boundary.absorbedSolarWM2?.[layer] ?? 0) / 2;
    gain(inner, sun);
    gain(outer, sun);
    const resistance = stack.layers[layer]?.resistanceM2KW ?? 0;
    if (resistance > 0) {
      const conducted = (at(inner) - at(outer)) / resistance;
      gain(inner, -conducted);
      gain(outer, conducted);
      slope(inner, inner, -1 / resistance);
      slope(inner, outer, 1 / resistance);
      slope(outer, outer, -1 / resistance);
      slope(outer, inner, 1 / resistance);
    }
    if (layer < count - 1) {
      const above = nodes.inner[layer + 1] as number;
      const air = gapAir(stack, layer, at(outer), at(above), cosTilt);
      gain(outer, -air.heat);
      gain(above, air.heat);
      slope(outer, outer, -air.slope);
      slope(outer, above, air.slope);
      slope(above, above, -air.slope);
      slope(above, outer, air.slope);
    }
  }
  const last = nodes.outer[count - 1] as number;
  const outsideAir = boundary.outsideCoefficientWM2K * (at(last) - boundary.outsideAirC);
  gain(last, -outsideAir);
  slope(last, last, -boundary.outsideCoefficientWM2K);
  return { residual, jacobian, room, longwave, latent: latent.heat, outsideAir };
}

/** Emitted σT⁴ of floor, faces and surroundings, in the order of the exchange. */
function emitterPowers(
  exchange: LongwaveExchange,
  nodes: Nodes,
  boundary: CoverBoundary,
  temps: Float64Array,
): Float64Array {
  const count = nodes.inner.length;
  const power = new Float64Array(exchange.emitters);
  power[0] = emission(boundary.insideRadiantC);
  for (let layer = 0; layer < count; layer += 1) {
    power[1 + layer] = emission(temps[nodes.inner[layer] as number] as number);
    power[1 + count + layer] = emission(temps[nodes.outer[layer] as number] as number);
  }
  power[exchange.emitters - 1] =
    boundary.skyViewFrac * emission(boundary.skyC) + (1 - boundary.skyViewFrac) * emission(boundary.groundC);
  return power;
}

function addLongwave(
  exchange: LongwaveExchange,
  nodes: Nodes,
  longwave: Float64Array,
  layer: number,
  temps: Float64Array,
  gain: (node: number, heat: number) => void,
  slope: (node: number, by: number, value: number) => void,
): void {
  const count = nodes.inner.length;
  const inner = nodes.inner[layer] as number;
  const outer = nodes.outer[layer] as number;
  gain(inner, longwave[layer] as number);
  gain(outer, -(longwave[layer + 1] as number));
  const below = exchange.flow[layer] as Float64Array;
  const above = exchange.flow[layer + 1] as Float64Array;
  for (let other = 0; other < count; other += 1) {
    const innerNode = nodes.inner[other] as number;
    const outerNode = nodes.outer[other] as number;
    const innerSlope = emissionSlope(temps[innerNode] as number);
    const outerSlope = emissionSlope(temps[outerNode] as number);
    slope(inner, innerNode, (below[1 + other] as number) * innerSlope);
    slope(inner, outerNode, (below[1 + count + other] as number) * outerSlope);
    slope(outer, innerNode, -(above[1 + other] as number) * innerSlope);
    slope(outer, outerNode, -(above[1 + count + other] as number) * outerSlope);
  }
}

/** Heat of the water that condenses on a face below the dew point. */
function latentHeat(boundary: CoverBoundary, faceC: number, coefficient: number): AirFlow {
  if (boundary.vapourPressurePa === undefined) return { heat: 0, slope: 0 };
  const saturated = saturationPressurePa(faceC);
  if (saturated >= boundary.vapourPressurePa) return { heat: 0, slope: 0 };
  const scale = EVAPORATION_JKG * LEWIS * coefficient;
  const steepness = saturationPressurePa(faceC + 0.5) - saturationPressurePa(faceC - 0.5);
  return { heat: scale * (boundary.vapourPressurePa - saturated), slope: scale * steepness };
}

/** A straight line between both airs. */
function firstGuess(nodes: Nodes, boundary: CoverBoundary): Float64Array {
  return Float64Array.from({ length: nodes.count }, (_, node) => {
    const share = (node + 1) / (nodes.count + 1);
    return boundary.insideAirC * (1 - share) + boundary.outsideAirC * share;
  });
}

function balance(
  stack: CoverStack,
  exchange: LongwaveExchange,
  nodes: Nodes,
  boundary: CoverBoundary,
  start?: number[],
): CoverBalance {
  checkBoundary(boundary);
  const cosTilt = Math.cos((boundary.tiltDeg * Math.PI) / 180);
  const temps = start === undefined ? firstGuess(nodes, boundary) : fromFaces(nodes, start);
  for (let iteration = 1; iteration <= MAX_ITERATIONS; iteration += 1) {
    const { residual, jacobian } = evaluate(stack, exchange, nodes, boundary, temps, cosTilt);
    const right = Array.from(residual, (value) => Float64Array.of(-value));
    const change = solveDense(jacobian, right);
    let largest = 0;
    for (let node = 0; node < nodes.count; node += 1) {
      const step = change[node]?.[0] ?? 0;
      largest = Math.max(largest, Math.abs(step));
      temps[node] = (temps[node] as number) + Math.min(MAX_STEP_K, Math.max(-MAX_STEP_K, step));
    }
    if (largest < CONVERGED_K) return describe(stack, exchange, nodes, boundary, temps, cosTilt, iteration);
  }
  throw new EngineInputError({
    quantity: "cover",
    value: boundary.outsideAirC,
    reason: "inconsistent",
    note: "The balance of this cover could not be found.",
  });
}

function fromFaces(nodes: Nodes, faces: number[]): Float64Array {
  const temps = new Float64Array(nodes.count);
  nodes.inner.forEach((node, layer) => {
    temps[node] = faces[2 * layer] ?? 0;
    temps[nodes.outer[layer] as number] = faces[2 * layer + 1] ?? 0;
  });
  return temps;
}

function describe(
  stack: CoverStack,
  exchange: LongwaveExchange,
  nodes: Nodes,
  boundary: CoverBoundary,
  temps: Float64Array,
  cosTilt: number,
  iterations: number,
): CoverBalance {
  const state = evaluate(stack, exchange, nodes, boundary, temps, cosTilt);
  const power = emitterPowers(exchange, nodes, boundary, temps);
  const leavingUp = exchange.leaving.reduce((sum, share, j) => sum + share * (power[j] as number), 0);
  const fromRoom = state.room.heat + (state.longwave[0] as number) + state.latent;
  const difference = boundary.insideAirC - boundary.outsideAirC;
  return {
    faceTempsC: stack.layers.flatMap((_, layer) => [
      temps[nodes.inner[layer] as number] as number,
      temps[nodes.outer[layer] as number] as number,
    ]),
    fromRoomConvectionWM2: state.room.heat,
    fromRoomRadiationWM2: state.longwave[0] as number,
    fromRoomLatentWM2: state.latent,
    fromRoomWM2: fromRoom,
    toOutsideAirWM2: state.outsideAir,
    toSkyWM2: boundary.skyViewFrac * (leavingUp - emission(boundary.skyC)),
    toGroundWM2: (1 - boundary.skyViewFrac) * (leavingUp - emission(boundary.groundC)),
    uValueWM2K: difference === 0 ? 0 : fromRoom / difference,
    iterations,
    residualWM2: Math.max(...Array.from(state.residual, Math.abs)),
  };
}
