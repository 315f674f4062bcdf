import { requireInRange } from "../errors.ts";
import { type EfficiencyBasis, grossEfficiencyFrac } from "./efficiency-basis.ts";

/** Whose rule for thin air applies; "none" for plates that already hold the site's height. */
export type AltitudeRule = "us" | "canada" | "none";

export interface PlateRating {
  ratedW: number;
  /** What the plate names: fuel burnt or heat given. */
  basis: "input" | "output";
  /** Of the heat in the fuel; used where the plate names the input. For heat pumps heat over electricity. */
  efficiencyFrac: number;
  /** Heating value the efficiency is counted on; gross unless said. The input is the gross one the fuel is billed by. */
  efficiencyBasis?: EfficiencyBasis;
  /** Net over gross heating value of the fuel, needed for a net basis. */
  netOverGrossFrac?: number;
  /** False for electric heat, which loses nothing in thin air. */
  burnsFuel: boolean;
  altitudeM: number;
  altitudeRule?: AltitudeRule;
  /** Input on the fuel really burnt over the plate's, where the burner was converted; 1 when it burns what the plate says. */
  fuelChangeFactor?: number;
}

const FOOT_M = 0.3048;
/** Thin air is counted from here upwards, and then for the whole height above the sea. */
const FIRST_FEET = 2000;
const LOSS_PER_1000_FT = 0.04;
/** Canadian plates: a tenth less in a band, above it as elsewhere. */
const CANADA = { fromFeet: 2000, toFeet: 4500, factor: 0.9 } as const;

/**
 * Share of the rated heat a burner gives at a height above the sea.
 *
 * Units m → 0 to 1. Valid −500 to 6000 m. Errors EngineInputError. Source [NFPA54] 4 % for each 1000 ft, the whole height counted
 * from 2000 ft on; [CSA-B149] a tenth less from 2000 to 4500 ft. Local codes rule, and plates for high places may already hold it.
 */
export function altitudeFactor(altitudeM: number, rule: AltitudeRule = "us"): number {
  const feet = requireInRange("altitudeM", altitudeM, -500, 6000, "m") / FOOT_M;
  if (rule === "none" || feet < FIRST_FEET) return 1;
  if (rule === "canada" && feet <= CANADA.toFeet) return CANADA.factor;
  return Math.max(0.2, 1 - (LOSS_PER_1000_FT * feet) / 1000);
}

/**
 * Heat one heater really gives to the room. Sizes are only comparable as this, never as input.
 *
 * Units W → W. Valid rating 1 W to 100 MW, efficiency 0.1 to 1.2 of fuel and up to 7 of electricity, fuel change 0.5 to
 * 1.2. Errors EngineInputError. Source [NFPA54], [STOICHIOMETRY].
 */
export function deliveredOutputW(plate: PlateRating): number {
  const { ratedW, basis, efficiencyFrac, burnsFuel, altitudeM } = plate;
  requireInRange("ratedW", ratedW, 1, 1e8, "W");
  const change = requireInRange("fuelChangeFactor", plate.fuelChangeFactor ?? 1, 0.5, 1.2);
  if (!burnsFuel) {
    requireInRange("efficiencyFrac", efficiencyFrac, 0.1, 7);
    return basis === "input" ? ratedW * efficiencyFrac : ratedW;
  }
  requireInRange("efficiencyFrac", efficiencyFrac, 0.1, 1.2);
  const atSea = basis === "input" ? ratedW * inputEfficiency(plate) : ratedW;
  return change * atSea * altitudeFactor(altitudeM, plate.altitudeRule);
}

/** Plates name the input on the gross value; a net efficiency has to be brought to it. */
function inputEfficiency({
  efficiencyFrac,
  efficiencyBasis = "gross",
  netOverGrossFrac,
}: PlateRating): number {
  if (efficiencyBasis === "gross") return efficiencyFrac;
  return grossEfficiencyFrac(efficiencyFrac, "net", netOverGrossFrac ?? Number.NaN);
}

/** Heat of a row of equal heaters, W. Valid 0 to 500 heaters. Errors EngineInputError. Source [NFPA54]. */
export function rowOutputW(plate: PlateRating, count: number): number {
  return requireInRange("count", count, 0, 500) * deliveredOutputW(plate);
}
