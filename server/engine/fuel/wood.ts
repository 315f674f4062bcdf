import { requireInRange } from "../errors.ts";

/** Dry wood, MJ/kg net and gross; its hydrogen makes the difference. Source [WOODVALUE]. */
const DRY_NET_MJ_KG = 18.9;
const DRY_GROSS_MJ_KG = 20.2;
/** Heat of evaporating the water in the wood, MJ/kg. Source [WOODVALUE]. */
const EVAPORATION_MJ_KG = 2.443;

export interface WoodValue {
  netKwhKg: number;
  grossKwhKg: number;
  netOverGrossFrac: number;
}

/**
 * Heating value of wood by its moisture on the wet basis: kilograms of water in a kilogram as burnt.
 *
 * Units 0 to 0.65 → kWh/kg. Pellets 0.06 to 0.10, dry chips 0.20 to 0.30, green chips 0.45 to 0.55. Errors EngineInputError.
 * Source [WOODVALUE].
 */
export function woodValue(moistureFrac: number): WoodValue {
  requireInRange("moistureFrac", moistureFrac, 0, 0.65);
  const dry = 1 - moistureFrac;
  const netKwhKg = (DRY_NET_MJ_KG * dry - EVAPORATION_MJ_KG * moistureFrac) / 3.6;
  const grossKwhKg = (DRY_GROSS_MJ_KG * dry) / 3.6;
  return { netKwhKg, grossKwhKg, netOverGrossFrac: netKwhKg / grossKwhKg };
}

/** Moisture on the wet basis from the dry basis (water over dry wood). Units 0 to 1.8 → 0 to 0.65. Errors EngineInputError. Source [WOODVALUE]. */
export function wetBasisMoisture(dryBasisFrac: number): number {
  requireInRange("dryBasisFrac", dryBasisFrac, 0, 1.8);
  return dryBasisFrac / (1 + dryBasisFrac);
}
