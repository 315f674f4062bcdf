import { deliveredOutputW } from "../heaters/delivered-output.ts";
import type { HeaterInput } from "../plan/house-input.ts";
import type { HeaterUnit } from "../plan/sizing-types.ts";

/**
 * The fitted heaters by what they really give at the site's height, a row for each entry of the survey.
 * Shape: heaters, site height m → rows in W. Throws EngineInputError as the heater functions do. Source [NFPA54] through them.
 */
export function installedUnits(heaters: readonly HeaterInput[], elevationM: number): HeaterUnit[] {
  return heaters
    .filter((heater) => heater.count > 0)
    .map((heater) => ({
      outputW: deliveredOutputW({ ...heater, altitudeM: elevationM }),
      count: heater.count,
      existing: true,
      label: heater.label,
    }));
}

/** One entry for every single heater, W. */
export function unitOutputsW(units: readonly HeaterUnit[]): number[] {
  return units.flatMap((unit) => Array<number>(unit.count).fill(unit.outputW));
}

/** All heaters together, W. */
export function totalOutputW(units: readonly HeaterUnit[]): number {
  return units.reduce((sum, unit) => sum + unit.outputW * unit.count, 0);
}
