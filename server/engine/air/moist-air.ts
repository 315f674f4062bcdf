import { STANDARD_PRESSURE_PA, ZERO_CELSIUS_K } from "../constants.ts";
import { requireInRange } from "../errors.ts";
import { dewPointFromPressureC, saturationPressurePa } from "./saturation.ts";

/** Molar mass of water over that of dry air. Source [ASHRAE-F17]. */
const MASS_RATIO = 0.621945;
/** Gas constant of dry air, J/(kg K). Source [ASHRAE-F17]. */
const DRY_AIR_GAS_CONSTANT = 287.042;
/** Specific heats of dry air and of water vapour, J/(kg K). Source [ASHRAE-F17]. */
export const DRY_AIR_HEAT_JKGK = 1006;
export const VAPOUR_HEAT_JKGK = 1860;

/** Range checks shared by the functions of this file. */
function checkPressure(pressurePa: number): void {
  requireInRange("pressurePa", pressurePa, 40_000, 120_000, "Pa");
}

/**
 * Air pressure at a height above the sea in the standard atmosphere.
 *
 * Units m → Pa. Valid −500 to 6000 m. Errors EngineInputError. Source [ASHRAE-F17] equation 3.
 */
export function pressureAtAltitudePa(altitudeM: number): number {
  requireInRange("altitudeM", altitudeM, -500, 6000, "m");
  return STANDARD_PRESSURE_PA * (1 - 2.25577e-5 * altitudeM) ** 5.2559;
}

/**
 * Water in the air per kilogram of dry air, from relative humidity.
 *
 * Units °C, 0 to 1, Pa → kg/kg. Valid −90 to 60 °C. Errors EngineInputError. Source [ASHRAE-F17] equation 20.
 */
export function humidityRatio(
  tempC: number,
  humidityFrac: number,
  pressurePa = STANDARD_PRESSURE_PA,
): number {
  return humidityRatioFromPressure(vapourPressurePa(tempC, humidityFrac), pressurePa);
}

/**
 * Vapour pressure of air of a relative humidity. Units °C, 0 to 1 → Pa. Valid −90 to 60 °C. Errors EngineInputError.
 * Source [ASHRAE-F17].
 */
export function vapourPressurePa(tempC: number, humidityFrac: number): number {
  requireInRange("tempC", tempC, -90, 60, "°C");
  requireInRange("humidityFrac", humidityFrac, 0, 1);
  return humidityFrac * saturationPressurePa(tempC);
}

/** Units Pa, Pa → kg/kg. Errors EngineInputError when the vapour would fill more than half of the pressure. Source [ASHRAE-F17]. */
export function humidityRatioFromPressure(vapourPa: number, pressurePa = STANDARD_PRESSURE_PA): number {
  checkPressure(pressurePa);
  requireInRange("vapourPa", vapourPa, 0, pressurePa / 2, "Pa");
  return (MASS_RATIO * vapourPa) / (pressurePa - vapourPa);
}

/**
 * Water in the air from its dew point (frost point below 0 °C). Units °C, Pa → kg/kg. Valid −90 to 60 °C. Errors EngineInputError.
 * Source [ASHRAE-F17] equation 36.
 */
export function humidityRatioFromDewPoint(dewPointTempC: number, pressurePa = STANDARD_PRESSURE_PA): number {
  return humidityRatio(dewPointTempC, 1, pressurePa);
}

/** Vapour pressure of a humidity ratio. Units kg/kg, Pa → Pa. Errors EngineInputError. Source [ASHRAE-F17]. */
export function vapourPressureFromRatioPa(ratio: number, pressurePa = STANDARD_PRESSURE_PA): number {
  checkPressure(pressurePa);
  requireInRange("ratio", ratio, 0, 0.5, "kg/kg");
  return (ratio * pressurePa) / (MASS_RATIO + ratio);
}

/** Relative humidity from water content. Units °C, kg/kg, Pa → 0 to 1 and above when oversaturated. Errors EngineInputError. Source [ASHRAE-F17]. */
export function relativeHumidityFrac(
  tempC: number,
  ratio: number,
  pressurePa = STANDARD_PRESSURE_PA,
): number {
  return vapourPressureFromRatioPa(ratio, pressurePa) / saturationPressurePa(tempC);
}

/**
 * Dew point, below 0 °C the frost point. Units °C, 0.001 to 1 → °C. Errors EngineInputError. Source [ASHRAE-F17].
 */
export function dewPointC(tempC: number, humidityFrac: number): number {
  requireInRange("humidityFrac", humidityFrac, 0.001, 1);
  return dewPointFromPressureC(vapourPressurePa(tempC, humidityFrac));
}

/** Heat content per kilogram of dry air above dry air at 0 °C. Units °C, kg/kg → kJ/kg. Errors EngineInputError. Source [ASHRAE-F17] equation 30. */
export function enthalpyKjKg(tempC: number, ratio: number): number {
  requireInRange("tempC", tempC, -90, 60, "°C");
  requireInRange("ratio", ratio, 0, 0.5, "kg/kg");
  return (DRY_AIR_HEAT_JKGK * tempC + ratio * (2_501_000 + VAPOUR_HEAT_JKGK * tempC)) / 1000;
}

/** Volume of the air that holds one kilogram of dry air. Units °C, kg/kg, Pa → m³/kg. Errors EngineInputError. Source [ASHRAE-F17] equation 26. */
export function specificVolumeM3Kg(tempC: number, ratio: number, pressurePa = STANDARD_PRESSURE_PA): number {
  requireInRange("tempC", tempC, -90, 60, "°C");
  requireInRange("ratio", ratio, 0, 0.5, "kg/kg");
  checkPressure(pressurePa);
  return (DRY_AIR_GAS_CONSTANT * (tempC + ZERO_CELSIUS_K) * (1 + ratio / MASS_RATIO)) / pressurePa;
}

/** Mass of moist air per cubic metre. Units °C, kg/kg, Pa → kg/m³. Errors EngineInputError. Source [ASHRAE-F17]. */
export function airDensityKgM3(tempC: number, ratio = 0, pressurePa = STANDARD_PRESSURE_PA): number {
  return (1 + ratio) / specificVolumeM3Kg(tempC, ratio, pressurePa);
}

/** Heat to warm one cubic metre of air by one kelvin. Units °C, kg/kg, Pa → Wh/(m³ K); about 0.335 near the sea. Errors EngineInputError. Source [ASHRAE-F17]. */
export function airHeatCapacityWhM3K(tempC: number, ratio = 0, pressurePa = STANDARD_PRESSURE_PA): number {
  const joules =
    (DRY_AIR_HEAT_JKGK + ratio * VAPOUR_HEAT_JKGK) / specificVolumeM3Kg(tempC, ratio, pressurePa);
  return joules / 3600;
}

/** Heat of evaporation of water. Units °C → kJ/kg. Valid −40 to 100 °C. Errors EngineInputError. Source [ASHRAE-F17], linear fit. */
export function evaporationHeatKjKg(tempC: number): number {
  requireInRange("tempC", tempC, -40, 100, "°C");
  return 2501 - 2.361 * tempC;
}

/** Heat that leaves ice as vapour. Units °C → kJ/kg. Valid −60 to 0 °C. Errors EngineInputError. Source [ASHRAE-F17], linear fit. */
export function sublimationHeatKjKg(tempC: number): number {
  requireInRange("tempC", tempC, -60, 0, "°C");
  return 2830 - 0.24 * tempC;
}

/**
 * Whole heat carried off by exhaust air that came in as outdoor air: what warms it and the water it takes along.
 *
 * Units m³/h at inside conditions, kg/kg, °C, Pa → W. Negative where outdoor air brings heat. Errors EngineInputError.
 * Source [ASHRAE-F17], difference of enthalpies per kilogram of dry air.
 */
export function exhaustEnthalpyW(
  flowM3H: number,
  inside: { tempC: number; ratio: number },
  outdoor: { tempC: number; ratio: number },
  pressurePa = STANDARD_PRESSURE_PA,
): number {
  requireInRange("flowM3H", flowM3H, 0, 1e8, "m³/h");
  const dryAirKgH = flowM3H / specificVolumeM3Kg(inside.tempC, inside.ratio, pressurePa);
  const gainKjKg = enthalpyKjKg(inside.tempC, inside.ratio) - enthalpyKjKg(outdoor.tempC, outdoor.ratio);
  return (dryAirKgH * gainKjKg) / 3.6;
}
