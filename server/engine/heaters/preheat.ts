import { requireInRange } from "../errors.ts";

export interface PreheatInput {
  /** Heat held by air, fittings and the part of floor and walls that warms along, J/K. */
  capacityJK: number;
  lossCoefficientWK: number;
  startTempC: number;
  wantedTempC: number;
  outdoorTempC: number;
}

/**
 * Output that warms an empty house to a temperature within so many hours, before the stock comes in.
 *
 * Units J/K, W/K, °C, h → W. Valid 0.1 to 200 h, a wanted temperature above the start. Never less than what holds the wanted
 * temperature. Errors EngineInputError. Source [STAGING], lumped capacity under a steady heater.
 */
export function preheatOutputW(input: PreheatInput, hours: number): number {
  requireInRange("capacityJK", input.capacityJK, 1, 1e13, "J/K");
  requireInRange("lossCoefficientWK", input.lossCoefficientWK, 1e-3, 1e9, "W/K");
  requireInRange("outdoorTempC", input.outdoorTempC, -70, 50, "°C");
  requireInRange("startTempC", input.startTempC, -70, 45, "°C");
  requireInRange("wantedTempC", input.wantedTempC, input.startTempC, 45, "°C");
  requireInRange("hours", hours, 0.1, 200, "h");
  const left = Math.exp((-hours * 3600 * input.lossCoefficientWK) / input.capacityJK);
  const lift =
    (input.wantedTempC - input.outdoorTempC - (input.startTempC - input.outdoorTempC) * left) / (1 - left);
  const holdsK = input.wantedTempC - input.outdoorTempC;
  return input.lossCoefficientWK * Math.max(0, lift, holdsK);
}
