import { saturationPressurePa } from "../air/saturation.ts";
import { STEFAN_BOLTZMANN_WM2K4, ZERO_CELSIUS_K } from "../constants.ts";
import { airLayerCoefficient, insideCoefficient } from "./convection.ts";
import type { CoverBoundary, CoverStack } from "./cover-types.ts";
import type { LongwaveExchange } from "./longwave-exchange.ts";

/** Vapour that reaches a cold face by the Lewis relation, kg/(s m² Pa) for one W/(m² K) of convection. From memory, theory 6.4 to 6.9e-9. */
const LEWIS = 6.4e-9;
const EVAPORATION_JKG = 2.45e6;
/** Which unknown stands for the inner and the outer face of each layer. */
interface Nodes {
  inner: number[];
  outer: number[];
  count: number;
}

/** Gives every face of a stack its unknown. */
export function nodesOf(stack: CoverStack): Nodes {
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

/** What a black face sends out, W/m². */
export const emission = (tempC: number) => STEFAN_BOLTZMANN_WM2K4 * (tempC + ZERO_CELSIUS_K) ** 4;
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

/** Everything a solve needs, made once per cover: the inner loop of a year allocates nothing but its answer. */
export interface Workspace {
  stack: CoverStack;
  exchange: LongwaveExchange;
  nodes: Nodes;
  temps: Float64Array;
  power: Float64Array;
  powerSlope: Float64Array;
  longwave: Float64Array;
  residual: Float64Array;
  /** Row after row. */
  jacobian: Float64Array;
  room: AirFlow & { coefficient: number };
  latent: AirFlow;
  outsideAirWM2: number;
}

/** A workspace for one cover. */
export function createWorkspace(stack: CoverStack, exchange: LongwaveExchange, nodes: Nodes): Workspace {
  const size = nodes.count;
  return {
    stack,
    exchange,
    nodes,
    temps: new Float64Array(size),
    power: new Float64Array(exchange.emitters),
    powerSlope: new Float64Array(size),
    longwave: new Float64Array(stack.layers.length + 1),
    residual: new Float64Array(size),
    jacobian: new Float64Array(size * size),
    room: { heat: 0, slope: 0, coefficient: 0 },
    latent: { heat: 0, slope: 0 },
    outsideAirWM2: 0,
  };
}

/** An entry of a list whose index is known to be inside it. */
export const at = (list: ArrayLike<number>, index: number) => list[index] as number;

/** Emitted σT⁴ of floor, faces and surroundings, in the order of the exchange, and its slope at every node. */
function setEmission(work: Workspace, boundary: CoverBoundary): void {
  const { nodes, power, powerSlope, temps, exchange } = work;
  const count = nodes.inner.length;
  power[0] = emission(boundary.insideRadiantC);
  for (let layer = 0; layer < count; layer += 1) {
    power[1 + layer] = emission(at(temps, at(nodes.inner, layer)));
    power[1 + count + layer] = emission(at(temps, at(nodes.outer, layer)));
  }
  for (let node = 0; node < nodes.count; node += 1) powerSlope[node] = emissionSlope(at(temps, node));
  power[exchange.emitters - 1] =
    boundary.skyViewFrac * emission(boundary.skyC) + (1 - boundary.skyViewFrac) * emission(boundary.groundC);
}

function setLongwave(work: Workspace): void {
  const { exchange, longwave, power } = work;
  for (let gap = 0; gap < longwave.length; gap += 1) {
    const line = exchange.flow[gap] as Float64Array;
    let sum = 0;
    for (let j = 0; j < line.length; j += 1) sum += at(line, j) * at(power, j);
    longwave[gap] = sum;
  }
}

/** Adds a flow from one node to another to residual and Jacobian. */
function addFlow(work: Workspace, from: number, to: number, flow: AirFlow): void {
  const { residual, jacobian, nodes } = work;
  const size = nodes.count;
  residual[from] = at(residual, from) - flow.heat;
  residual[to] = at(residual, to) + flow.heat;
  jacobian[from * size + from] = at(jacobian, from * size + from) - flow.slope;
  jacobian[from * size + to] = at(jacobian, from * size + to) + flow.slope;
  jacobian[to * size + to] = at(jacobian, to * size + to) - flow.slope;
  jacobian[to * size + from] = at(jacobian, to * size + from) + flow.slope;
}

/** Adds a flow between a node and something whose temperature is given; positive into the node, falling as it warms. */
function addBoundaryFlow(work: Workspace, node: number, flow: AirFlow): void {
  const { residual, jacobian, nodes } = work;
  residual[node] = at(residual, node) + flow.heat;
  const diagonal = node * nodes.count + node;
  jacobian[diagonal] = at(jacobian, diagonal) - flow.slope;
}

/** Fills residual and Jacobian for the temperatures in the workspace. */
export function evaluate(work: Workspace, boundary: CoverBoundary, cosTilt: number): void {
  const { stack, nodes, temps, residual, jacobian } = work;
  const count = stack.layers.length;
  residual.fill(0);
  jacobian.fill(0);
  setEmission(work, boundary);
  setLongwave(work);
  const first = at(nodes.inner, 0);
  work.room = roomAir(boundary, at(temps, first), cosTilt);
  addBoundaryFlow(work, first, work.room);
  work.latent = latentHeat(boundary, at(temps, first), work.room.coefficient);
  addBoundaryFlow(work, first, work.latent);
  for (let layer = 0; layer < count; layer += 1) {
    const inner = at(nodes.inner, layer);
    const outer = at(nodes.outer, layer);
    addLongwave(work, layer);
    const sun = (boundary.absorbedSolarWM2?.[layer] ?? 0) / 2;
    residual[inner] = at(residual, inner) + sun;
    residual[outer] = at(residual, outer) + sun;
    const resistance = stack.layers[layer]?.resistanceM2KW ?? 0;
    if (resistance > 0) {
      addFlow(work, inner, outer, {
        heat: (at(temps, inner) - at(temps, outer)) / resistance,
        slope: 1 / resistance,
      });
    }
    if (layer < count - 1) {
      const above = at(nodes.inner, layer + 1);
      addFlow(work, outer, above, gapAir(stack, layer, at(temps, outer), at(temps, above), cosTilt));
    }
  }
  const last = at(nodes.outer, count - 1);
  work.outsideAirWM2 = boundary.outsideCoefficientWM2K * (at(temps, last) - boundary.outsideAirC);
  addBoundaryFlow(work, last, { heat: -work.outsideAirWM2, slope: boundary.outsideCoefficientWM2K });
}

/** Radiation that reaches and leaves one layer, and how it changes with every face. */
function addLongwave(work: Workspace, layer: number): void {
  const { exchange, nodes, longwave, residual, jacobian, powerSlope } = work;
  const count = nodes.inner.length;
  const size = nodes.count;
  const inner = at(nodes.inner, layer);
  const outer = at(nodes.outer, layer);
  residual[inner] = at(residual, inner) + at(longwave, layer);
  residual[outer] = at(residual, outer) - at(longwave, layer + 1);
  const below = exchange.flow[layer] as Float64Array;
  const above = exchange.flow[layer + 1] as Float64Array;
  for (let other = 0; other < count; other += 1) {
    const innerNode = at(nodes.inner, other);
    const outerNode = at(nodes.outer, other);
    const row = inner * size;
    jacobian[row + innerNode] =
      at(jacobian, row + innerNode) + at(below, 1 + other) * at(powerSlope, innerNode);
    jacobian[row + outerNode] =
      at(jacobian, row + outerNode) + at(below, 1 + count + other) * at(powerSlope, outerNode);
    const rowOut = outer * size;
    jacobian[rowOut + innerNode] =
      at(jacobian, rowOut + innerNode) - at(above, 1 + other) * at(powerSlope, innerNode);
    jacobian[rowOut + outerNode] =
      at(jacobian, rowOut + outerNode) - at(above, 1 + count + other) * at(powerSlope, outerNode);
  }
}

/** Heat of the water that condenses on a face below the dew point. */
function latentHeat(boundary: CoverBoundary, faceC: number, coefficient: number): AirFlow {
  if (boundary.vapourPressurePa === undefined) return NOTHING;
  const saturated = saturationPressurePa(faceC);
  if (saturated >= boundary.vapourPressurePa) return NOTHING;
  const scale = EVAPORATION_JKG * LEWIS * coefficient;
  const steepness = saturationPressurePa(faceC + 0.5) - saturationPressurePa(faceC - 0.5);
  return { heat: scale * (boundary.vapourPressurePa - saturated), slope: scale * steepness };
}

const NOTHING: AirFlow = { heat: 0, slope: 0 };
