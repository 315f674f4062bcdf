import { requireInRange } from "../errors.ts";

export interface PlateRating {
  ratedW: number;
  /** What the plate names: fuel burnt or heat given. */
  basis: "input" | "output";
  /** Of the heat in the fuel, gross; used where the plate names the input. */
  efficiencyFrac: number;
  /** False for electric heat, which loses nothing in thin air. */
  burnsFuel: boolean;
  altitudeM: number;
}

const FOOT_M = 0.3048;
/** Thin air is counted from here upwards, and then for the whole height above the sea. */
const FIRST_FEET = 2000;
const LOSS_PER_1000_FT = 0.04;

/**
 * Share of the rated heat a burner gives at a height above the sea.
 *
 * Units m → 0 to 1. Valid −500 to 6000 m. Errors EngineInputError. Source [NFPA54]; local codes differ (Canada 10 % from 2000 to
 * 4500 ft), and plates for high places may already hold it.
 */
export function altitudeFactor(altitudeM: number): number {
  const feet = requireInRange("altitudeM", altitudeM, -500, 6000, "m") / FOOT_M;
  return feet < FIRST_FEET ? 1 : Math.max(0.2, 1 - (LOSS_PER_1000_FT * feet) / 1000);
}

/**
 * Heat one heater really gives to the room.
 *
 * Units W → W. Valid rating 1 W to 100 MW, efficiency 0.1 to 1.2. Errors EngineInputError. Source [NFPA54].
 */
export function deliveredOutputW({
  ratedW,
  basis,
  efficiencyFrac,
  burnsFuel,
  altitudeM,
}: PlateRating): number {
  requireInRange("ratedW", ratedW, 1, 1e8, "W");
  requireInRange("efficiencyFrac", efficiencyFrac, 0.1, 1.2);
  const atSea = basis === "input" ? ratedW * efficiencyFrac : ratedW;
  return burnsFuel ? atSea * altitudeFactor(altitudeM) : atSea;
}
