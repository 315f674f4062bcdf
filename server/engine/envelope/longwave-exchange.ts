import { EngineInputError, requireInRange } from "../errors.ts";
import { solveDense } from "../numeric/dense.ts";
import type { CoverStack } from "./cover-types.ts";

/**
 * How the radiation that leaves floor, faces and sky is shared out in a stack, worked out once for given properties.
 * With emitters e = (floor, inner faces, outer faces, sky) as σT⁴, the net upward flow in gap k is Σ flow[k][j] e[j], where
 * k 0 lies between the floor and the first layer and k N above the last. `leaving[j]` is what goes up from the top.
 */
export interface LongwaveExchange {
  emitters: number;
  flow: Float64Array[];
  leaving: Float64Array;
}

function checkLayer(stack: CoverStack, index: number): void {
  const layer = stack.layers[index];
  if (layer === undefined) return;
  const { emissivityIn, emissivityOut, longwaveTransmittance, resistanceM2KW } = layer;
  requireInRange("emissivityIn", emissivityIn, 0, 1, "", index);
  requireInRange("emissivityOut", emissivityOut, 0, 1, "", index);
  requireInRange("resistanceM2KW", resistanceM2KW, 0, 100, "m²·K/W", index);
  requireInRange(
    "longwaveTransmittance",
    longwaveTransmittance,
    0,
    1 - Math.max(emissivityIn, emissivityOut),
    "",
    index,
  );
  if (resistanceM2KW > 0 && longwaveTransmittance > 0) {
    throw new EngineInputError({
      quantity: "longwaveTransmittance",
      value: longwaveTransmittance,
      reason: "inconsistent",
      index,
      note: "A layer that lets longwave radiation through must be a film without resistance.",
    });
  }
}

/**
 * Solves the radiosity network of a stack for unit emission of every emitter.
 *
 * Shapes: N layers give 2 N + 2 emitters. Units: fractions. Valid: emissivity plus transmittance at most 1 on each face.
 * Errors EngineInputError naming layer and property. Source [NETWORK].
 */
export function longwaveExchange(stack: CoverStack, floorEmissivity: number): LongwaveExchange {
  const count = stack.layers.length;
  requireInRange("layers", count, 1, 12);
  requireInRange("floorEmissivity", floorEmissivity, 0, 1);
  for (let index = 0; index < count; index += 1) checkLayer(stack, index);

  // Unknowns: upward radiosities 0…N, then downward radiosities of layers 1…N.
  const size = 2 * count + 1;
  const emitters = 2 * count + 2;
  const up = (layer: number) => layer;
  const down = (layer: number) => count + layer;
  const matrix = Array.from({ length: size }, (_, row) => {
    const line = new Float64Array(size);
    line[row] = 1;
    return line;
  });
  const right = Array.from({ length: size }, () => new Float64Array(emitters));
  const sky = emitters - 1;
  const set = (row: number, column: number, value: number) => {
    const line = matrix[row];
    if (line !== undefined) line[column] = (line[column] ?? 0) + value;
  };
  const emit = (row: number, emitter: number, value: number) => {
    const line = right[row];
    if (line !== undefined) line[emitter] = (line[emitter] ?? 0) + value;
  };
  emit(0, 0, floorEmissivity);
  set(0, down(1), -(1 - floorEmissivity));
  stack.layers.forEach((layer, index) => {
    const number = index + 1;
    const tau = layer.longwaveTransmittance;
    const reflectIn = 1 - tau - layer.emissivityIn;
    const reflectOut = 1 - tau - layer.emissivityOut;
    emit(up(number), count + number, layer.emissivityOut);
    set(up(number), up(number - 1), -tau);
    emit(down(number), number, layer.emissivityIn);
    set(down(number), up(number - 1), -reflectIn);
    if (number < count) {
      set(up(number), down(number + 1), -reflectOut);
      set(down(number), down(number + 1), -tau);
    } else {
      emit(up(number), sky, reflectOut);
      emit(down(number), sky, tau);
    }
  });
  const radiosity = solveDense(matrix, right);
  const flow = Array.from({ length: count + 1 }, (_, gap) => {
    const line = new Float64Array(emitters);
    for (let j = 0; j < emitters; j += 1) {
      const below = radiosity[up(gap)]?.[j] ?? 0;
      const above = gap < count ? (radiosity[down(gap + 1)]?.[j] ?? 0) : j === sky ? 1 : 0;
      line[j] = below - above;
    }
    return line;
  });
  return { emitters, flow, leaving: radiosity[up(count)] ?? new Float64Array(emitters) };
}
