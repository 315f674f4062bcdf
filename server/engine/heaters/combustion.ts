import { requireInRange } from "../errors.ts";

/** A fuel of carbon and hydrogen alone. */
export interface Hydrocarbon {
  carbonAtoms: number;
  hydrogenAtoms: number;
  /** Gross heating value, MJ/kg. */
  grossMjKg: number;
}

/** Molar masses, g/mol. Source [STOICHIOMETRY]. */
const CARBON = 12.011;
const HYDROGEN = 1.008;
const WATER = 18.015;
const CARBON_DIOXIDE = 44.009;
/** Heat of condensing water at 25 °C, MJ/kg. Source [STOICHIOMETRY]. */
const CONDENSING_MJ_KG = 2.442;
/** Carbon dioxide at 20 °C and 101.3 kPa, kg/m³. Source [STOICHIOMETRY]. */
const CARBON_DIOXIDE_KG_M3 = 1.83;

/** Fuels burnt in barns. Heating values from memory. Source [STOICHIOMETRY]. */
export const hydrocarbons = {
  methane: { carbonAtoms: 1, hydrogenAtoms: 4, grossMjKg: 55.5 },
  propane: { carbonAtoms: 3, hydrogenAtoms: 8, grossMjKg: 50.35 },
  butane: { carbonAtoms: 4, hydrogenAtoms: 10, grossMjKg: 49.5 },
  kerosene: { carbonAtoms: 12, hydrogenAtoms: 26, grossMjKg: 47.5 },
} as const satisfies Record<string, Hydrocarbon>;

export interface CombustionYield {
  waterKgKwh: number;
  carbonDioxideKgKwh: number;
  /** At 20 °C. */
  carbonDioxideM3Kwh: number;
  /** Net over gross heating value: what is left when the water stays vapour. */
  netOverGrossFrac: number;
}

/**
 * Water and carbon dioxide of complete combustion, for each kWh gross.
 *
 * Units atoms, MJ/kg → kg/kWh, m³/kWh. Valid 1 to 20 carbon, 0 to 44 hydrogen atoms, 20 to 60 MJ/kg. Errors EngineInputError.
 * Source [STOICHIOMETRY].
 */
export function combustionYield(fuel: Hydrocarbon): CombustionYield {
  requireInRange("carbonAtoms", fuel.carbonAtoms, 1, 20);
  requireInRange("hydrogenAtoms", fuel.hydrogenAtoms, 0, 44);
  requireInRange("grossMjKg", fuel.grossMjKg, 20, 60, "MJ/kg");
  const molarMass = fuel.carbonAtoms * CARBON + fuel.hydrogenAtoms * HYDROGEN;
  const kwhKg = fuel.grossMjKg / 3.6;
  const waterKgKg = ((fuel.hydrogenAtoms / 2) * WATER) / molarMass;
  const carbonDioxideKgKwh = (fuel.carbonAtoms * CARBON_DIOXIDE) / molarMass / kwhKg;
  return {
    waterKgKwh: waterKgKg / kwhKg,
    carbonDioxideKgKwh,
    carbonDioxideM3Kwh: carbonDioxideKgKwh / CARBON_DIOXIDE_KG_M3,
    netOverGrossFrac: 1 - (CONDENSING_MJ_KG * waterKgKg) / fuel.grossMjKg,
  };
}
