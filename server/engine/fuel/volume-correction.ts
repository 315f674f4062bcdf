import { STANDARD_PRESSURE_PA, ZERO_CELSIUS_K } from "../constants.ts";
import { requireInRange } from "../errors.ts";

/** Change of volume for each kelvin, liquids near 15 °C. Typical. Source [VOLUMES]. */
export const liquidExpansionPerK = { propane: 0.0028, butane: 0.0018, oil: 0.00083 } as const;

/**
 * Litres at 15 °C of a liquid measured warmer or colder. Meters that correct for temperature do this already.
 *
 * Units L, °C, 1/K → L. Valid −40 to 50 °C. Errors EngineInputError. Source [VOLUMES].
 */
export function litresAt15C(litres: number, tempC: number, expansionPerK: number): number {
  requireInRange("litres", litres, 0, 1e9, "L");
  requireInRange("tempC", tempC, -40, 50, "°C");
  requireInRange("expansionPerK", expansionPerK, 0, 0.01, "1/K");
  return litres / (1 + expansionPerK * (tempC - 15));
}

/**
 * Standard cubic metres of gas metered at another pressure and temperature.
 *
 * Units m³, Pa (absolute), °C → m³. Valid 50 to 1000 kPa, −30 to 50 °C, reference 0 to 25 °C. Errors EngineInputError.
 * Source [VOLUMES], ideal gas.
 */
export function standardGasM3(meteredM3: number, pressurePa: number, tempC: number, referenceC = 15): number {
  requireInRange("meteredM3", meteredM3, 0, 1e9, "m³");
  requireInRange("pressurePa", pressurePa, 50_000, 1_000_000, "Pa");
  requireInRange("tempC", tempC, -30, 50, "°C");
  requireInRange("referenceC", referenceC, 0, 25, "°C");
  return (
    (meteredM3 * (pressurePa / STANDARD_PRESSURE_PA) * (referenceC + ZERO_CELSIUS_K)) /
    (tempC + ZERO_CELSIUS_K)
  );
}
