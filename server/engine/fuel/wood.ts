import { requireInRange } from "../errors.ts";
import type { FuelProperties } from "./fuel-properties.ts";

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

/** Carbon dioxide, methane and nitrous oxide of wood, for each kWh gross: 93.8 kg, 7.2 g and 3.6 g for a million Btu. Source [EPAHUB2024]. */
const WOOD_EMISSIONS = { carbonDioxideKg: 0.3201, methaneG: 0.02457, nitrousOxideG: 0.01228 } as const;

/**
 * Wood of a moisture as a fuel that can be counted in kg, t or poured cubic metres.
 *
 * Units 0 to 0.65, kg/m³ as poured → fuel. Valid bulk 50 to 900 kg/m³. Errors EngineInputError. Source [WOODVALUE], [EPAHUB2024].
 */
export function woodFuel(id: string, moistureFrac: number, bulkKgPerM3: number): FuelProperties {
  const { grossKwhKg, netOverGrossFrac } = woodValue(moistureFrac);
  return {
    id,
    netOverGrossFrac,
    kwhGrossPerKg: grossKwhKg,
    bulkKgPerM3: requireInRange("bulkKgPerM3", bulkKgPerM3, 50, 900, "kg/m³"),
    carbonDioxideKgPerKwh: WOOD_EMISSIONS.carbonDioxideKg,
    biogenic: true,
    methaneGPerKwh: WOOD_EMISSIONS.methaneG,
    nitrousOxideGPerKwh: WOOD_EMISSIONS.nitrousOxideG,
  };
}
