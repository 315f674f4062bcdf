import type { ScreenInput } from "../plan/house-input.ts";

/** Speed of air through an open screen edge, m/s. Source [SLOTAIR]. */
const SLOT_AIR_MS = 0.2;

/**
 * Air that passes a closed screen through the open slots along its two long edges.
 * Shape: screen, house length m, floor area m² → m³/(h m²) of screen. Source [SLOTAIR].
 */
export function screenLeakageM3HM2(screen: ScreenInput, lengthM: number, floorAreaM2: number): number {
  const slotAreaM2 = 2 * screen.edgeGapM * lengthM;
  return (3600 * SLOT_AIR_MS * slotAreaM2) / (floorAreaM2 * Math.max(0.1, screen.coverageFrac));
}
