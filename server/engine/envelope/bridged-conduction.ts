import { EngineInputError, requireInRange } from "../errors.ts";
import { type ConductionLayer, layerResistanceM2KW } from "./layered-conduction.ts";

/** A layer that differs across the face: each part with its share of the area. */
export interface BridgedLayer {
  parts: { areaFrac: number; layer: ConductionLayer }[];
}

export interface BridgedInput {
  layers: (ConductionLayer | BridgedLayer)[];
  insideSurfaceM2KW: number;
  outsideSurfaceM2KW: number;
}

export interface BridgedResult {
  /** Heat keeps to its own path from surface to surface. */
  upperM2KW: number;
  /** Every plane parallel to the surface is equally warm. */
  lowerM2KW: number;
  resistanceM2KW: number;
  uValueWM2K: number;
}

const isBridged = (layer: ConductionLayer | BridgedLayer): layer is BridgedLayer => "parts" in layer;

function checkShares(layer: BridgedLayer, index: number): void {
  const sum = layer.parts.reduce(
    (total, part) => total + requireInRange("areaFrac", part.areaFrac, 0, 1, "", index),
    0,
  );
  if (Math.abs(sum - 1) > 1e-9) {
    throw new EngineInputError({
      quantity: "areaFrac",
      value: sum,
      reason: "inconsistent",
      index,
      note: "The shares of a layer must add up to 1.",
    });
  }
}

/** All combinations of one part of each bridged layer, as share and resistance of the path. */
function paths(layers: BridgedInput["layers"]): { share: number; resistance: number }[] {
  return layers.reduce(
    (all, layer) =>
      all.flatMap(({ share, resistance }) =>
        isBridged(layer)
          ? layer.parts.map((part) => ({
              share: share * part.areaFrac,
              resistance: resistance + layerResistanceM2KW(part.layer),
            }))
          : [{ share, resistance: resistance + layerResistanceM2KW(layer) }],
      ),
    [{ share: 1, resistance: 0 }],
  );
}

/**
 * Resistance of a wall with studs, rails or other bridges: the mean of both limits of the combined method. Not for steel studs or
 * metal-faced panels with fasteners through them.
 *
 * Units m² K/W, shares of 1. Errors EngineInputError when shares do not add up to 1. Source [ISO6946] combined method.
 */
export function bridgedConduction(input: BridgedInput): BridgedResult {
  requireInRange("insideSurfaceM2KW", input.insideSurfaceM2KW, 0, 1, "m²·K/W");
  requireInRange("outsideSurfaceM2KW", input.outsideSurfaceM2KW, 0, 1, "m²·K/W");
  input.layers.forEach((layer, index) => {
    if (isBridged(layer)) checkShares(layer, index);
  });
  const surfaces = input.insideSurfaceM2KW + input.outsideSurfaceM2KW;
  const upperM2KW =
    1 / paths(input.layers).reduce((sum, { share, resistance }) => sum + share / (surfaces + resistance), 0);
  const lowerM2KW = input.layers.reduce((sum, layer) => {
    if (!isBridged(layer)) return sum + layerResistanceM2KW(layer);
    return (
      sum + 1 / layer.parts.reduce((flow, part) => flow + part.areaFrac / layerResistanceM2KW(part.layer), 0)
    );
  }, surfaces);
  const resistanceM2KW = (upperM2KW + lowerM2KW) / 2;
  return { upperM2KW, lowerM2KW, resistanceM2KW, uValueWM2K: 1 / resistanceM2KW };
}
