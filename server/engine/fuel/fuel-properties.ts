import { EngineInputError, requireInRange } from "../errors.ts";

/** What a fuel is worth and what burning it gives off. Numbers come from the reference table or from the bill. */
export interface FuelProperties {
  id: string;
  netOverGrossFrac: number;
  /** Gases metered by volume, kWh gross for each m³ as billed; best taken from the bill itself. */
  kwhGrossPerM3?: number;
  /** kWh gross for each kg. */
  kwhGrossPerKg?: number;
  /** Liquids, kg for each litre at 15 °C. */
  kgPerL?: number;
  /** Loose wood, kg for each m³ poured. */
  bulkKgPerM3?: number;
  /** kg for each kWh gross. */
  carbonDioxideKgPerKwh: number;
  /** Carbon that grew lately; reported beside, never netted silently. */
  biogenic: boolean;
  /** g for each kWh gross. */
  methaneGPerKwh?: number;
  nitrousOxideGPerKwh?: number;
}

/** A property that a unit needs; EngineInputError names fuel and property where it is missing. */
export function neededProperty(
  fuel: FuelProperties,
  property: "kwhGrossPerM3" | "kwhGrossPerKg" | "kgPerL" | "bulkKgPerM3",
): number {
  const value = fuel[property];
  if (value !== undefined) return requireInRange(property, value, 1e-6, 1e5);
  throw new EngineInputError({
    quantity: property,
    value: Number.NaN,
    reason: "inconsistent",
    note: `${fuel.id} is not measured this way: ${property} is not known for it.`,
  });
}
