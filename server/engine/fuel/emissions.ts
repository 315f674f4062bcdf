import { requireInRange } from "../errors.ts";
import type { GrossKwh } from "./energy-kinds.ts";
import type { FuelProperties } from "./fuel-properties.ts";

/** Warming of a kilogram over a hundred years against carbon dioxide; which report it comes from is kept with the result. */
export interface WarmingSet {
  name: string;
  methane: number;
  nitrousOxide: number;
}

/** Fifth assessment report. Source [IPCC2013]. */
export const warmingAr5: WarmingSet = { name: "AR5", methane: 28, nitrousOxide: 265 };
/** Fourth assessment report. Source [IPCC2013]. */
export const warmingAr4: WarmingSet = { name: "AR4", methane: 25, nitrousOxide: 298 };

export interface FuelEmissions {
  /** Carbon dioxide of fossil carbon, kg. */
  fossilKg: number;
  /** Carbon dioxide of carbon that grew lately, kg; stands beside the total, not in it. */
  biogenicKg: number;
  /** Methane and nitrous oxide as carbon dioxide, kg; counted for wood as well. */
  otherKgEquivalent: number;
  /** Fossil and other, kg of carbon dioxide equivalent. */
  totalKgEquivalent: number;
  warmingSet: string;
}

/**
 * What burning an amount of fuel gives off, fossil and biogenic carbon kept apart.
 *
 * Units kWh gross → kg. Errors EngineInputError. Source [EPAHUB2024], [IPCC2013].
 */
export function fuelEmissions(
  energy: GrossKwh,
  fuel: FuelProperties,
  warming: WarmingSet = warmingAr5,
): FuelEmissions {
  requireInRange("carbonDioxideKgPerKwh", fuel.carbonDioxideKgPerKwh, 0, 2, "kg/kWh");
  const methaneKg = (energy * requireInRange("methaneGPerKwh", fuel.methaneGPerKwh ?? 0, 0, 10, "g")) / 1000;
  const nitrousKg =
    (energy * requireInRange("nitrousOxideGPerKwh", fuel.nitrousOxideGPerKwh ?? 0, 0, 10, "g")) / 1000;
  const carbonDioxideKg = energy * fuel.carbonDioxideKgPerKwh;
  const fossilKg = fuel.biogenic ? 0 : carbonDioxideKg;
  const otherKgEquivalent = methaneKg * warming.methane + nitrousKg * warming.nitrousOxide;
  return {
    fossilKg,
    biogenicKg: fuel.biogenic ? carbonDioxideKg : 0,
    otherKgEquivalent,
    totalKgEquivalent: fossilKg + otherKgEquivalent,
    warmingSet: warming.name,
  };
}

/**
 * Emission factor on the gross value from one on the net value in t/TJ, as the international guidelines give it.
 *
 * Units t/TJ net, 0.6 to 1 → kg/kWh gross. Errors EngineInputError. Source [IPCC2006].
 */
export function grossFactorFromNet(tonnesPerTjNet: number, netOverGrossFrac: number): number {
  requireInRange("tonnesPerTjNet", tonnesPerTjNet, 0, 300, "t/TJ");
  requireInRange("netOverGrossFrac", netOverGrossFrac, 0.6, 1);
  return tonnesPerTjNet * 0.0036 * netOverGrossFrac;
}
