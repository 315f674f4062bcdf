import type { CoverStack } from "./cover-types.ts";

/** Longwave properties of a continuous film of water. From memory: transmittance at most 0.03, emissivity 0.93 to 0.96. */
const WATER = { emissivity: 0.93, transmittance: 0.02 } as const;

/**
 * The same cover with water on its inner face: it then takes up and sends out radiation nearly like a black body and lets
 * almost none through.
 *
 * Shapes, units as the stack. Errors none. Source [NETWORK]; properties from memory.
 */
export function wetInside(stack: CoverStack): CoverStack {
  const [inner, ...rest] = stack.layers;
  if (inner === undefined) return stack;
  const transmittance = Math.min(inner.longwaveTransmittance, WATER.transmittance);
  const outLimit = 1 - transmittance;
  const emissivityOut = Math.min(
    outLimit,
    Math.max(inner.emissivityOut, inner.longwaveTransmittance > 0.03 ? 0.9 : 0),
  );
  return {
    ...stack,
    layers: [
      {
        ...inner,
        emissivityIn: Math.max(inner.emissivityIn, WATER.emissivity),
        emissivityOut,
        longwaveTransmittance: transmittance,
      },
      ...rest,
    ],
  };
}
