import { requireInRange } from "../errors.ts";
import { type GrossKwh, grossFromNet, grossKwh, netKwh } from "./energy-kinds.ts";
import { type FuelProperties, neededProperty } from "./fuel-properties.ts";

const BTU_KWH = 1055.05585262 / 3.6e6;
const CUBIC_FOOT_M3 = 0.3048 ** 3;
const US_GALLON_L = 3.785411784;
const IMPERIAL_GALLON_L = 4.54609;
const POUND_KG = 0.45359237;

/** Units of energy, kWh each. They say nothing of gross or net: the bill must. Source [NIST811]. */
const ENERGY = {
  kWh: 1,
  MWh: 1000,
  MJ: 1 / 3.6,
  GJ: 1000 / 3.6,
  therm: 1e5 * BTU_KWH,
  MMBtu: 1e6 * BTU_KWH,
} as const;
/** Units of volume, m³ each. ccf is a hundred, Mcf a thousand cubic feet. Source [NIST811]. */
const GAS = { m3: 1, ccf: 100 * CUBIC_FOOT_M3, Mcf: 1000 * CUBIC_FOOT_M3 } as const;
/** L each. Source [NIST811]. */
const LIQUID = { L: 1, galUS: US_GALLON_L, galUK: IMPERIAL_GALLON_L } as const;
/** kg each; a bottle by its filling. Source [NIST811]. */
const MASS = {
  kg: 1,
  t: 1000,
  lb: POUND_KG,
  shortTon: 2000 * POUND_KG,
  bottle45: 45,
  bottle48: 48,
  bag15: 15,
} as const;
/** Poured wood, m³ each. */
const BULK = { looseM3: 1 } as const;

export type FuelUnit =
  | keyof typeof ENERGY
  | keyof typeof GAS
  | keyof typeof LIQUID
  | keyof typeof MASS
  | keyof typeof BULK;

/** Every unit the trade counts fuel in. */
export const fuelUnits = [
  ...Object.keys(ENERGY),
  ...Object.keys(GAS),
  ...Object.keys(LIQUID),
  ...Object.keys(MASS),
  ...Object.keys(BULK),
] as FuelUnit[];

/** Which heating value units of energy were counted on; other units need no answer. */
export type EnergyCount = "gross" | "net";

function has<T extends object>(units: T, unit: string): unit is Extract<keyof T, string> {
  return unit in units;
}

/**
 * Gross energy in one of a unit of a fuel.
 *
 * Shape: unit, fuel, gross or net for units of energy → kWh gross. A unit the fuel is not measured in throws EngineInputError
 * naming the missing property. Source [NIST811] factors, [HEATINGVALUE].
 */
export function kwhGrossPerUnit(
  unit: FuelUnit,
  fuel: FuelProperties,
  counted: EnergyCount = "gross",
): GrossKwh {
  if (has(ENERGY, unit))
    return counted === "gross"
      ? grossKwh(ENERGY[unit])
      : grossFromNet(netKwh(ENERGY[unit]), fuel.netOverGrossFrac);
  if (has(GAS, unit)) return grossKwh(GAS[unit] * neededProperty(fuel, "kwhGrossPerM3"));
  const perKg = neededProperty(fuel, "kwhGrossPerKg");
  if (has(LIQUID, unit)) return grossKwh(LIQUID[unit] * neededProperty(fuel, "kgPerL") * perKg);
  if (has(MASS, unit)) return grossKwh(MASS[unit] * perKg);
  return grossKwh(BULK[unit] * neededProperty(fuel, "bulkKgPerM3") * perKg);
}

/** Gross energy of an amount of fuel. Units as the unit says → kWh gross. Valid ±1e9 of the unit. Errors EngineInputError. Source [HEATINGVALUE]. */
export function energyOf(
  amount: number,
  unit: FuelUnit,
  fuel: FuelProperties,
  counted: EnergyCount = "gross",
): GrossKwh {
  requireInRange("amount", amount, -1e9, 1e9, unit);
  return grossKwh(amount * kwhGrossPerUnit(unit, fuel, counted));
}

/** Amount of fuel that holds an energy. Units kWh gross → the unit. Errors EngineInputError. Source [HEATINGVALUE]. */
export function amountOf(
  energy: GrossKwh,
  unit: FuelUnit,
  fuel: FuelProperties,
  counted: EnergyCount = "gross",
): number {
  return energy / kwhGrossPerUnit(unit, fuel, counted);
}

/** Units a fuel can be counted in. Errors none. Source [HEATINGVALUE]. */
export function unitsOf(fuel: FuelProperties): FuelUnit[] {
  const byMass = fuel.kwhGrossPerKg !== undefined;
  return fuelUnits.filter((unit) => {
    if (has(ENERGY, unit)) return true;
    if (has(GAS, unit)) return fuel.kwhGrossPerM3 !== undefined;
    if (has(LIQUID, unit)) return byMass && fuel.kgPerL !== undefined;
    if (has(BULK, unit)) return byMass && fuel.bulkKgPerM3 !== undefined;
    return byMass;
  });
}
