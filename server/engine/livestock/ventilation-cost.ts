import { requireInRange } from "../errors.ts";
import type { VentilationRule } from "./minimum-ventilation.ts";

export interface VentilationCost {
  rule: VentilationRule;
  flowM3H: number;
  /** Heat the air takes along on the design night, W. */
  nightW: number;
  /** Heat over the season, kWh delivered. */
  seasonKwh: number;
  /** Fuel over the season, kWh gross. */
  seasonFuelKwh: number;
}

export interface VentilationCostInput {
  partsM3H: Record<VentilationRule, number>;
  airHeatWhM3K: number;
  nightDifferenceK: number;
  /** Sum over the season of kelvins below the temperature at which heating begins, times hours, K h. */
  degreeHoursKh: number;
  /** Seasonal efficiency of the heaters on the gross value. */
  efficiencyFrac: number;
}

/**
 * What each rule for the least ventilation costs in heat and in fuel, dearest first. Only the rule that governs is paid for; the
 * others show what holding another limit would cost.
 *
 * Units m³/h, Wh/(m³ K), K, K h → W, kWh. Valid up to 10 000 000 m³/h, 400 000 K h, efficiency 0.1 to 6. Errors EngineInputError.
 * Source: heat of the air.
 */
export function ventilationCosts(input: VentilationCostInput): VentilationCost[] {
  requireInRange("airHeatWhM3K", input.airHeatWhM3K, 0.15, 0.5, "Wh/(m³ K)");
  requireInRange("nightDifferenceK", input.nightDifferenceK, 0, 100, "K");
  requireInRange("degreeHoursKh", input.degreeHoursKh, 0, 400_000, "K h");
  requireInRange("efficiencyFrac", input.efficiencyFrac, 0.1, 6);
  return (Object.keys(input.partsM3H) as VentilationRule[])
    .map((rule) => {
      const flowM3H = requireInRange("flowM3H", input.partsM3H[rule], 0, 1e7, "m³/h");
      const lossWK = flowM3H * input.airHeatWhM3K;
      const seasonKwh = (lossWK * input.degreeHoursKh) / 1000;
      return {
        rule,
        flowM3H,
        nightW: lossWK * input.nightDifferenceK,
        seasonKwh,
        seasonFuelKwh: seasonKwh / input.efficiencyFrac,
      };
    })
    .sort((a, b) => b.flowM3H - a.flowM3H);
}
