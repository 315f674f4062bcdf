import { EngineInputError, requireInRange } from "../errors.ts";
import type { CoverGap, CoverStack } from "./cover-types.ts";
import { type LongwaveExchange, longwaveExchange } from "./longwave-exchange.ts";

/** Heat carried by a flow of air of 1 m³/h for one kelvin: 1.2 kg/m³ × 1006 J/(kg K) / 3600, W/K. Source [ISO6946], from memory. */
const AIR_FLOW_WK = 0.3353;

/** An entry of a list whose index is known to be inside it. */
export const at = (list: ArrayLike<number>, index: number) => list[index] as number;

/**
 * A cover as a network of unknown temperatures, with everything worked out that its weather does not change.
 * Unknowns: every face from the room outwards (one for a film, two for a thick layer), then the air of those gaps through which
 * air flows. Longwave terms act on σT⁴ of the faces, of what stands in the room and of what lies outside.
 */
export interface CoverNetwork {
  layers: number;
  faces: number;
  size: number;
  /** Unknown of the inner and of the outer face of each layer. */
  inner: Int32Array;
  outer: Int32Array;
  /** Conductance of each layer, W/(m² K); 0 for films. */
  layerWM2K: Float64Array;
  /** Unknown of the air in each gap, −1 where no air flows through it. */
  gapAir: Int32Array;
  /** Given coefficient of each gap, or NaN where the law of air layers rules; its conduction limit and its factor for heat going down. */
  gapFixedWM2K: Float64Array;
  gapConductionWM2K: Float64Array;
  gapDownFactor: Float64Array;
  /** Conductance of the air that comes from the space below and from outside, W/(m² K). */
  gapLeakWM2K: Float64Array;
  gapVentWM2K: Float64Array;
  /** Net longwave into face i for σT⁴ of face j (row after row), of the room, of the outside. */
  intoFace: Float64Array;
  intoFaceFromRoom: Float64Array;
  intoFaceFromOutside: Float64Array;
  /** Net longwave out of the room, and what rises from the outermost layer, for the same emitters; room and outside last. */
  outOfRoom: Float64Array;
  rising: Float64Array;
}

function checkGap(gap: CoverGap, index: number): void {
  if (gap.kind === "fixed") requireInRange("coefficientWM2K", gap.coefficientWM2K, 0, 100, "W/(m²·K)", index);
  else requireInRange("thicknessM", gap.thicknessM, 0.0005, 5, "m", index);
  requireInRange("airLeakageM3HM2", gap.airLeakageM3HM2, 0, 1000, "m³/(h·m²)", index);
  requireInRange("outsideAirM3HM2", gap.outsideAirM3HM2 ?? 0, 0, 1000, "m³/(h·m²)", index);
}

function checkGaps(stack: CoverStack): void {
  if (stack.gaps.length !== stack.layers.length - 1) {
    throw new EngineInputError({
      quantity: "gaps",
      value: stack.gaps.length,
      reason: "length",
      note: `A cover of ${stack.layers.length} layers has ${stack.layers.length - 1} gaps.`,
    });
  }
  stack.gaps.forEach(checkGap);
}

const leakage = (stack: CoverStack, gap: number) => AIR_FLOW_WK * (stack.gaps[gap]?.airLeakageM3HM2 ?? 0);
const ventilation = ({ kind, outsideAirM3HM2 = 0 }: CoverGap) =>
  kind === "inflated" || kind === "vented" ? AIR_FLOW_WK * outsideAirM3HM2 : 0;

/** Numbers the unknowns: faces first, then the air of gaps that air flows into or out of. */
function numberNodes(stack: CoverStack) {
  const count = stack.layers.length;
  const inner = new Int32Array(count);
  const outer = new Int32Array(count);
  let next = 0;
  stack.layers.forEach((layer, index) => {
    inner[index] = next;
    if (layer.resistanceM2KW > 0) next += 1;
    outer[index] = next;
    next += 1;
  });
  const faces = next;
  const gapAir = new Int32Array(count - 1).fill(-1);
  stack.gaps.forEach((gap, index) => {
    if (leakage(stack, index) + leakage(stack, index + 1) + ventilation(gap) > 0) {
      gapAir[index] = next;
      next += 1;
    }
  });
  return { inner, outer, faces, gapAir, size: next };
}

/** Sums the emitters of a row of the exchange up over the unknowns: inner and outer faces of a film are one. */
function byFace(row: Float64Array, nodes: ReturnType<typeof numberNodes>, count: number): Float64Array {
  const sum = new Float64Array(nodes.faces + 2);
  for (let layer = 0; layer < count; layer += 1) {
    const inner = at(nodes.inner, layer);
    const outer = at(nodes.outer, layer);
    sum[inner] = at(sum, inner) + at(row, 1 + layer);
    sum[outer] = at(sum, outer) + at(row, 1 + count + layer);
  }
  sum[nodes.faces] = at(row, 0);
  sum[nodes.faces + 1] = at(row, row.length - 1);
  return sum;
}

function absorption(exchange: LongwaveExchange, nodes: ReturnType<typeof numberNodes>, count: number) {
  const { faces } = nodes;
  const flow = exchange.flow.map((row) => byFace(row, nodes, count));
  const intoFace = new Float64Array(faces * faces);
  const intoFaceFromRoom = new Float64Array(faces);
  const intoFaceFromOutside = new Float64Array(faces);
  const add = (face: number, row: Float64Array, sign: number) => {
    for (let j = 0; j < faces; j += 1)
      intoFace[face * faces + j] = at(intoFace, face * faces + j) + sign * at(row, j);
    intoFaceFromRoom[face] = at(intoFaceFromRoom, face) + sign * at(row, faces);
    intoFaceFromOutside[face] = at(intoFaceFromOutside, face) + sign * at(row, faces + 1);
  };
  for (let layer = 0; layer < count; layer += 1) {
    add(at(nodes.inner, layer), flow[layer] as Float64Array, 1);
    add(at(nodes.outer, layer), flow[layer + 1] as Float64Array, -1);
  }
  return {
    intoFace,
    intoFaceFromRoom,
    intoFaceFromOutside,
    outOfRoom: flow[0] as Float64Array,
    rising: byFace(exchange.leaving, nodes, count),
  };
}

/**
 * Works out the network of a cover.
 *
 * Shapes: layers from the room outwards, one gap between each two; floor emissivity 0 to 1.
 * Valid: 1 to 12 layers, gaps of 0.5 mm to 5 m. Errors EngineInputError naming quantity and layer. Source [NETWORK], [ISO6946].
 */
export function coverNetwork(stack: CoverStack, floorEmissivity: number): CoverNetwork {
  const exchange = longwaveExchange(stack, floorEmissivity);
  checkGaps(stack);
  const nodes = numberNodes(stack);
  const count = stack.layers.length;
  const ofGaps = (value: (gap: CoverGap, index: number) => number) =>
    Float64Array.from(stack.gaps, (gap, index) => value(gap, index));
  return {
    layers: count,
    ...nodes,
    layerWM2K: Float64Array.from(stack.layers, ({ resistanceM2KW }) =>
      resistanceM2KW > 0 ? 1 / resistanceM2KW : 0,
    ),
    gapFixedWM2K: ofGaps((gap) => (gap.kind === "fixed" ? gap.coefficientWM2K : Number.NaN)),
    gapConductionWM2K: ofGaps((gap) => (gap.kind === "fixed" ? 0 : 0.025 / gap.thicknessM)),
    gapDownFactor: ofGaps((gap) => (gap.kind === "fixed" ? 0 : 0.09 * gap.thicknessM ** -0.44)),
    gapLeakWM2K: ofGaps((_, index) => leakage(stack, index)),
    gapVentWM2K: ofGaps(ventilation),
    ...absorption(exchange, nodes, count),
  };
}
