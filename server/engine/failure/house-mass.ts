import { requireInRange } from "../errors.ts";

/** Heat of a cubic metre of air and of concrete, J/(m³ K). Source [COOLINGMASS]. */
const AIR_JM3K = 1.2 * 1006;
const CONCRETE_JM3K = 2.1e6;
/** Air with what stands in it, over air alone. Source [COOLINGMASS]: 3 to 5. */
const AIR_AND_FITTINGS = 4;
/** Depth of inside surfaces that follows within hours, m: 25 to 50 mm; overnight 100 mm. Source [COOLINGMASS]. */
const DEPTH_M = { hours: 0.035, overnight: 0.1 } as const;

/** The uncertain heat a house holds, by what is expected and how far it may be off. */
export interface MassRange {
  lowJK: number;
  likelyJK: number;
  highJK: number;
}

/** How far the heat held may be off, both ways. Source [COOLINGMASS]. */
const OFF_BY = { low: 0.5, high: 2 } as const;

/**
 * Heat a house holds as it cools or warms: air, fittings and the skin of its heavy surfaces, with the range to reckon with.
 *
 * Units m³, m² → J/K. Valid volume 1 to 1e8 m³, heavy surface 0 to 1e7 m² (concrete and masonry only). Errors EngineInputError.
 * Source [COOLINGMASS].
 */
export function houseMass(
  volumeM3: number,
  heavySurfaceM2: number,
  span: keyof typeof DEPTH_M = "hours",
): MassRange {
  requireInRange("volumeM3", volumeM3, 1, 1e8, "m³");
  requireInRange("heavySurfaceM2", heavySurfaceM2, 0, 1e7, "m²");
  const likelyJK = AIR_AND_FITTINGS * AIR_JM3K * volumeM3 + CONCRETE_JM3K * DEPTH_M[span] * heavySurfaceM2;
  return massAround(likelyJK);
}

/** The range around a known or measured heat capacity: half of it to twice. Units J/K. Errors EngineInputError. Source [COOLINGMASS]. */
export function massAround(likelyJK: number): MassRange {
  requireInRange("likelyJK", likelyJK, 1, 1e13, "J/K");
  return { lowJK: OFF_BY.low * likelyJK, likelyJK, highJK: OFF_BY.high * likelyJK };
}
