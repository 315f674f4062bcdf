import type { CoverStack } from "../envelope/cover-types.ts";

/** Resistance of a closed air layer over 20 mm in a ceiling, heat going up, m² K/W. Source [ISO6946], table 2. */
const AIR_LAYER_M2KW = 0.16;
/** Film on either side of a ceiling, heat going up, m² K/W. Source [ISO6946]. */
const CEILING_FILM_M2KW = 0.1;

/**
 * U-value of a solid ceiling between two rooms, from its layers: the sum of resistances with a film on each side.
 * Shape: stack → W/(m² K). Source [ISO6946].
 */
export function ceilingUValueWM2K(stack: CoverStack): number {
  const layersM2KW = stack.layers.reduce((sum, layer) => sum + layer.resistanceM2KW, 0);
  return 1 / (2 * CEILING_FILM_M2KW + layersM2KW + stack.gaps.length * AIR_LAYER_M2KW);
}
