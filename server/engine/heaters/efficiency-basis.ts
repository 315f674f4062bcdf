import { requireInRange } from "../errors.ts";

/** Heating value an efficiency is counted on: gross with, net without the heat of condensing the flue's water. */
export type EfficiencyBasis = "gross" | "net";

/**
 * Efficiency on the gross value from one on either. A plate that says 95 % on the net value of natural gas gives 85.6 % of the
 * gross value the fuel is billed by.
 *
 * Units 0 to 1.2 → 0 to 1.1. `netOverGrossFrac` is the fuel's net over its gross value: 0.901 natural gas, 0.921 propane, 0.93 oil.
 * Electric heat has one value, 1. Errors EngineInputError. Source [STOICHIOMETRY].
 */
export function grossEfficiencyFrac(
  efficiencyFrac: number,
  basis: EfficiencyBasis,
  netOverGrossFrac: number,
): number {
  requireInRange("efficiencyFrac", efficiencyFrac, 0.1, 1.2);
  requireInRange("netOverGrossFrac", netOverGrossFrac, 0.7, 1);
  return basis === "gross" ? efficiencyFrac : efficiencyFrac * netOverGrossFrac;
}
