import { requireInRange } from "../errors.ts";
import { blackRadiativeWM2K, type HeatFlowDirection } from "./surface-resistance.ts";

export interface AirLayerInput {
  thicknessM: number;
  direction: HeatFlowDirection;
  emissivity1?: number;
  emissivity2?: number;
  meanTempC?: number;
  differenceK?: number;
}

/** Conduction and convection of a closed air layer, W/(m² K). Source [ISO6946] annex; up to 5 K the values are fixed. */
function convectionWM2K(thicknessM: number, direction: HeatFlowDirection, differenceK: number): number {
  const still = 0.025 / thicknessM;
  const warm = Math.max(5, differenceK);
  switch (direction) {
    case "up":
      return Math.max(differenceK <= 5 ? 1.95 : 1.14 * Math.cbrt(warm), still);
    case "horizontal":
      return Math.max(differenceK <= 5 ? 1.25 : 0.73 * Math.cbrt(warm), still);
    case "down":
      return Math.max((differenceK <= 5 ? 0.12 : 0.09 * warm ** 0.187) * thicknessM ** -0.44, still);
  }
}

/**
 * Resistance of a closed, unventilated air layer between two plane surfaces.
 *
 * Units m, 0 to 1, °C, K → m² K/W. Valid thickness 0.5 mm to 0.3 m, difference 0 to 60 K. Errors EngineInputError. Source [ISO6946].
 */
export function airLayerM2KW(input: AirLayerInput): number {
  const {
    thicknessM,
    direction,
    emissivity1 = 0.9,
    emissivity2 = 0.9,
    meanTempC = 10,
    differenceK = 5,
  } = input;
  requireInRange("thicknessM", thicknessM, 0.0005, 0.3, "m");
  requireInRange("emissivity1", emissivity1, 0.01, 1);
  requireInRange("emissivity2", emissivity2, 0.01, 1);
  requireInRange("differenceK", differenceK, 0, 60, "K");
  const exchange = 1 / (1 / emissivity1 + 1 / emissivity2 - 1);
  return 1 / (convectionWM2K(thicknessM, direction, differenceK) + exchange * blackRadiativeWM2K(meanTempC));
}
