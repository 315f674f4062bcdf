import { normalShareBelow } from "../climate/normal-distribution.ts";
import { requireInRange } from "../errors.ts";

export interface BarnHeatInput {
  insideTempC: number;
  outdoorTempC: number;
  /** Shell, floor edge and leaks beyond the fans, W/K. */
  shellWK: number;
  /** Least ventilation, m³/h. */
  airM3H: number;
  airHeatWhM3K: number;
  /** Sensible heat of the stock at the hour of the design, W. */
  stockSensibleW: number;
  /** Lamps, motors, mats, W. */
  otherGainsW?: number;
  /** Share of the ventilation heat an exchanger brings back. */
  recoveryFrac?: number;
}

export interface BarnHeat {
  shellW: number;
  /** After heat recovery, W. */
  ventilationW: number;
  gainsW: number;
  /** Heat the heaters must give; 0 where the animals cover all. */
  heatNeededW: number;
  /** Heat over the need; fans carry it off, it is never saved for another month. */
  surplusW: number;
  /** Air that holds the set-point: the least ventilation, more where there is a surplus. Infinite when it is no cooler outside. */
  airToHoldM3H: number;
  /** Where the house settles without any heater at the least ventilation. */
  unheatedTempC: number;
}

/**
 * Steady heat balance of a stocked barn on one night: q = V c ΔT + UA ΔT − animals − lamps, not below 0.
 *
 * Units °C, W/K, m³/h, Wh/(m³ K) → W. Valid −40 to 45 °C inside, −70 to 50 °C outside. The animals' heat is taken as given, though
 * it would rise a little in a cooler house. Errors EngineInputError. Source: steady balance, common practice.
 */
export function barnHeat(input: BarnHeatInput): BarnHeat {
  const { insideTempC, outdoorTempC, shellWK, airM3H, airHeatWhM3K, stockSensibleW } = input;
  const { otherGainsW = 0, recoveryFrac = 0 } = input;
  requireInRange("insideTempC", insideTempC, -40, 45, "°C");
  requireInRange("outdoorTempC", outdoorTempC, -70, 50, "°C");
  requireInRange("shellWK", shellWK, 0.1, 1e8, "W/K");
  requireInRange("airM3H", airM3H, 0, 1e8, "m³/h");
  requireInRange("airHeatWhM3K", airHeatWhM3K, 0.15, 0.5, "Wh/(m³ K)");
  requireInRange("stockSensibleW", stockSensibleW, 0, 1e9, "W");
  requireInRange("otherGainsW", otherGainsW, 0, 1e9, "W");
  requireInRange("recoveryFrac", recoveryFrac, 0, 0.95);
  const differenceK = insideTempC - outdoorTempC;
  const airWK = airM3H * airHeatWhM3K * (1 - recoveryFrac);
  const gainsW = stockSensibleW + otherGainsW;
  const shellW = shellWK * differenceK;
  const ventilationW = airWK * differenceK;
  const missingW = shellW + ventilationW - gainsW;
  const surplusW = Math.max(0, -missingW);
  return {
    shellW,
    ventilationW,
    gainsW,
    heatNeededW: Math.max(0, missingW),
    surplusW,
    airToHoldM3H: airToHold(surplusW, differenceK, airM3H, airHeatWhM3K, gainsW - shellW),
    unheatedTempC: outdoorTempC + gainsW / (shellWK + airWK),
  };
}

/** With a surplus the exchanger is by-passed and plain outdoor air carries the heat off. */
function airToHold(
  surplusW: number,
  differenceK: number,
  leastM3H: number,
  airHeatWhM3K: number,
  toCarryOffW: number,
): number {
  if (surplusW === 0) return leastM3H;
  if (differenceK <= 0) return Number.POSITIVE_INFINITY;
  return Math.max(leastM3H, toCarryOffW / (airHeatWhM3K * differenceK));
}

/** Temperatures of a month or of any other span of hours. */
export interface TemperatureSpan {
  meanC: number;
  /** Standard deviation of the hourly temperatures, K. */
  spreadK: number;
  hours: number;
}

/**
 * Hours in which it is colder outside than a temperature, hourly temperatures taken as normally distributed.
 *
 * Units °C, K, h → h. Valid −80 to 60 °C, spread 0.1 to 30 K. Errors EngineInputError. Source: normal distribution of hours.
 */
export function hoursBelow(tempC: number, spans: readonly TemperatureSpan[]): number {
  requireInRange("tempC", tempC, -80, 60, "°C");
  return spans.reduce((sum, span, index) => {
    requireInRange("meanC", span.meanC, -80, 60, "°C", index);
    requireInRange("spreadK", span.spreadK, 0.1, 30, "K", index);
    requireInRange("hours", span.hours, 0, 9000, "h", index);
    return sum + span.hours * normalShareBelow((tempC - span.meanC) / span.spreadK);
  }, 0);
}
