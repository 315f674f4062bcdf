import { requireInRange } from "../errors.ts";

export type HeatPumpSource = "air" | "ground";

/** COP = a + b dT + c dT² and the lifts it holds for, K. Source [STAFFELL2012]. */
const CURVES = {
  air: { a: 6.81, b: -0.121, c: 0.00063, minK: 15, maxK: 60 },
  ground: { a: 8.77, b: -0.15, c: 0.000734, minK: 20, maxK: 60 },
} as const;

/**
 * Heat over electricity of a heat pump by its lift, the water's flow temperature less the source's.
 *
 * Units K → ratio. Valid lift 15 to 60 K (air), 20 to 60 K (ground), derating 0.5 to 1: frost and barn dust take 5 to 15 %.
 * Errors EngineInputError. Source [STAFFELL2012]; whole systems in pig houses were measured at 2.5 to 3.4 [LICHARZ2020].
 */
export function heatPumpCop(source: HeatPumpSource, liftK: number, deratingFrac = 1): number {
  const { a, b, c, minK, maxK } = CURVES[source];
  requireInRange("liftK", liftK, minK, maxK, "K");
  requireInRange("deratingFrac", deratingFrac, 0.5, 1);
  return deratingFrac * (a + b * liftK + c * liftK ** 2);
}

/** Usual flow temperatures, °C. Source [STAFFELL2012]. */
export const flowTempsC = { warmAir: 30, floor: 40, largeRadiators: 52 } as const;

/** Rated outdoor temperature of air-source units, °C, and loss of output below it for each K. Typical, from memory. */
const RATED_AT_C = 7;
const LOSS_PER_K = 0.0225;

/**
 * Output an air-source unit keeps in the cold, over its rating at 7 °C: size it for the design night or add a second source.
 *
 * Units °C → 0 to 1. Valid −30 to 45 °C. Errors EngineInputError. Source [STAGING], typical.
 */
export function airSourceOutputFrac(outdoorTempC: number): number {
  requireInRange("outdoorTempC", outdoorTempC, -30, 45, "°C");
  return outdoorTempC >= RATED_AT_C ? 1 : 1 - LOSS_PER_K * (RATED_AT_C - outdoorTempC);
}

/** A part of the season: heat given and the COP it was given at. */
export interface HeatPumpSpan {
  heatKwh: number;
  cop: number;
}

/**
 * COP of a season: all heat over all electricity, never the mean of COPs.
 *
 * Units kWh → ratio. Valid heat above 0 in all, COP 0.8 to 12. Errors EngineInputError. Source: sums of energy.
 */
export function seasonalCop(spans: readonly HeatPumpSpan[]): number {
  let heat = 0;
  let electricity = 0;
  for (const [index, { heatKwh, cop }] of spans.entries()) {
    requireInRange("heatKwh", heatKwh, 0, 1e9, "kWh", index);
    requireInRange("cop", cop, 0.8, 12, "", index);
    heat += heatKwh;
    electricity += heatKwh / cop;
  }
  requireInRange("heatKwh", heat, 1e-9, 1e12, "kWh");
  return heat / electricity;
}

/**
 * COP above which electricity is cheaper than a fuel.
 *
 * Units price/kWh, price/kWh gross, 0 to 1.1 → ratio. Valid prices above 0. Errors EngineInputError. Source: equal cost of heat.
 */
export function breakEvenCop(
  electricityPricePerKwh: number,
  fuelPricePerKwhGross: number,
  heaterEfficiencyFrac: number,
): number {
  requireInRange("electricityPricePerKwh", electricityPricePerKwh, 1e-6, 1e6);
  requireInRange("fuelPricePerKwhGross", fuelPricePerKwhGross, 1e-6, 1e6);
  requireInRange("heaterEfficiencyFrac", heaterEfficiencyFrac, 0.1, 1.1);
  return electricityPricePerKwh / (fuelPricePerKwhGross / heaterEfficiencyFrac);
}
