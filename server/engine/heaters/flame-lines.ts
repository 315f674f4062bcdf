import { humidityRatio, specificVolumeM3Kg } from "../air/moist-air.ts";
import { STANDARD_PRESSURE_PA } from "../constants.ts";
import type { MinimumVentilation, VentilationRule } from "../livestock/minimum-ventilation.ts";
import type { CombustionYield } from "./combustion.ts";
import { type AirLine, flameAirByGasM3HKw, flameAirByWaterM3HKw } from "./unvented-house.ts";

export interface FlameLimits {
  insideTempC: number;
  humidityLimitFrac: number;
  outdoorTempC: number;
  outdoorHumidityFrac: number;
  carbonDioxideLimitPpm: number;
  outdoorCarbonDioxidePpm: number;
  pressurePa?: number;
}

/**
 * The rules for a barn's air with what flames without a flue add to them: their water to the humidity rule, their gas to the
 * carbon dioxide rule, nothing to the rates per head and by law.
 *
 * Shape: least ventilation of the animals, yield of the fuel, limits → lines for a house heated without flues. Where no air can
 * hold the humidity limit that rule is left out, as it is for the animals. Errors EngineInputError. Source [STOICHIOMETRY].
 */
export function flameLines(
  animals: Pick<MinimumVentilation, "partsM3H" | "humidityCanBeHeld">,
  fuel: CombustionYield,
  limits: FlameLimits,
): AirLine[] {
  const pressurePa = limits.pressurePa ?? STANDARD_PRESSURE_PA;
  const inside = humidityRatio(limits.insideTempC, limits.humidityLimitFrac, pressurePa);
  const outdoor = humidityRatio(limits.outdoorTempC, limits.outdoorHumidityFrac, pressurePa);
  const perKwM3H: Record<VentilationRule, number> = {
    moisture:
      animals.humidityCanBeHeld && inside - outdoor > 1e-5
        ? flameAirByWaterM3HKw(
            fuel.waterKgKwh,
            inside,
            outdoor,
            specificVolumeM3Kg(limits.insideTempC, inside, pressurePa),
          )
        : 0,
    carbonDioxide: flameAirByGasM3HKw(
      fuel.carbonDioxideM3Kwh,
      limits.carbonDioxideLimitPpm,
      limits.outdoorCarbonDioxidePpm,
    ),
    perHead: 0,
    legal: 0,
  };
  return (Object.keys(animals.partsM3H) as VentilationRule[]).map((rule) => ({
    rule,
    baseM3H: animals.partsM3H[rule],
    perKwM3H: perKwM3H[rule],
  }));
}
