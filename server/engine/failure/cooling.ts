import { requireInRange } from "../errors.ts";

export interface CoolingInput {
  /** Heat held by air, fittings and the first centimetres of floor, J/K. */
  capacityJK: number;
  lossCoefficientWK: number;
  startTempC: number;
  outdoorTempC: number;
  /** Heat that goes on, such as that of the animals, W. */
  remainingHeatW?: number;
}

function check(input: CoolingInput): void {
  requireInRange("capacityJK", input.capacityJK, 1, 1e13, "J/K");
  requireInRange("lossCoefficientWK", input.lossCoefficientWK, 1e-3, 1e9, "W/K");
  requireInRange("startTempC", input.startTempC, -60, 60, "°C");
  requireInRange("outdoorTempC", input.outdoorTempC, -70, 60, "°C");
}

/** Temperature a house goes towards with the heat that remains, °C. Units, errors as {@link CoolingInput}. Source [LUMPED]. */
export function endTempC(input: CoolingInput): number {
  check(input);
  return input.outdoorTempC + (input.remainingHeatW ?? 0) / input.lossCoefficientWK;
}

/** Temperature of a house so many hours after its heat stopped. Units h → °C. Errors EngineInputError. Source [LUMPED]. */
export function tempAfterHoursC(input: CoolingInput, hours: number): number {
  requireInRange("hours", hours, 0, 10_000, "h");
  const end = endTempC(input);
  const timeConstantH = input.capacityJK / input.lossCoefficientWK / 3600;
  return end + (input.startTempC - end) * Math.exp(-hours / timeConstantH);
}

/**
 * Hours until a house that cools reaches a temperature; null when it never does, 0 when it is there already.
 *
 * Units °C → h. Errors EngineInputError. Source [LUMPED].
 */
export function hoursToTemp(input: CoolingInput, criticalTempC: number): number | null {
  const end = endTempC(input);
  if (input.startTempC <= criticalTempC) return 0;
  if (end >= criticalTempC) return null;
  const timeConstantH = input.capacityJK / input.lossCoefficientWK / 3600;
  return -timeConstantH * Math.log((criticalTempC - end) / (input.startTempC - end));
}

/**
 * Hours until the air of a closed house holds so much carbon dioxide.
 *
 * Units m³, m³/h, shares of 1 → h; null without a source. Errors EngineInputError. Source: mass balance of still air.
 */
export function hoursToCarbonDioxide(
  volumeM3: number,
  sourceM3H: number,
  limitFrac: number,
  startFrac = 0.003,
): number | null {
  requireInRange("volumeM3", volumeM3, 1, 1e8, "m³");
  requireInRange("sourceM3H", sourceM3H, 0, 1e6, "m³/h");
  requireInRange("limitFrac", limitFrac, startFrac, 0.2);
  return sourceM3H === 0 ? null : (volumeM3 * (limitFrac - startFrac)) / sourceM3H;
}
