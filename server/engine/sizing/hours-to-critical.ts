import { AIR_HEAT_WHM3K } from "../balance/air-heat.ts";
import { hoursToTemp } from "../failure/cooling.ts";

export interface CoolingHouse {
  floorAreaM2: number;
  volumeM3: number;
  /** All losses over the temperature difference on the night, W/K. */
  lossCoefficientWK: number;
  startTempC: number;
  outdoorTempC: number;
  criticalTempC: number;
  /** Heat of the stock that goes on, W. */
  remainingHeatW: number;
}

export interface HoursRange {
  low: number | null;
  high: number | null;
}

/** Source [COOLINGMASS]. */
const AIR_AND_FITTINGS = { low: 3, high: 5 } as const;
const FLOOR_LAYER_JM2K = 0.025 * 2.1e6;
const FLOOR_COUPLING_WM2K = 6;

/**
 * Hours until a house whose heat has stopped, its fans running on, reaches its critical temperature.
 * Low end: only air and fittings cool, held up by a floor that stays warm; where that floor alone would save the house, and for
 * the high end, the top of the floor cools along. Null where the temperature is never reached.
 * Shape: house → hours. Throws EngineInputError as the cooling functions do. Source [COOLINGMASS], [LUMPED].
 */
export function hoursToCritical(house: CoolingHouse): HoursRange {
  const airJK = AIR_HEAT_WHM3K * 3600 * house.volumeM3;
  const floorWK = FLOOR_COUPLING_WM2K * house.floorAreaM2;
  const floorJK = FLOOR_LAYER_JM2K * house.floorAreaM2;
  const common = { startTempC: house.startTempC, outdoorTempC: house.outdoorTempC };
  const together = (share: number) =>
    hoursToTemp(
      {
        ...common,
        capacityJK: share * airJK + floorJK,
        lossCoefficientWK: house.lossCoefficientWK,
        remainingHeatW: house.remainingHeatW,
      },
      house.criticalTempC,
    );
  const airAlone = hoursToTemp(
    {
      ...common,
      capacityJK: AIR_AND_FITTINGS.low * airJK,
      lossCoefficientWK: house.lossCoefficientWK + floorWK,
      remainingHeatW: house.remainingHeatW + floorWK * (house.startTempC - house.outdoorTempC),
    },
    house.criticalTempC,
  );
  return { low: airAlone ?? together(AIR_AND_FITTINGS.low), high: together(AIR_AND_FITTINGS.high) };
}
