import { pressureAtAltitudePa } from "../air/moist-air.ts";
import type { HouseShell } from "../balance/house-losses.ts";
import { prepareShell } from "../balance/prepare-shell.ts";
import { type HouseGeometry, houseGeometry } from "../geometry/house-geometry.ts";
import type { HousePlanInput } from "./house-input.ts";

/** A house worked out once: its sizes, and its shell for design nights and for the hours of a year. */
export interface HouseModel {
  input: HousePlanInput;
  geometry: HouseGeometry;
  pressurePa: number;
  designShell: HouseShell;
  hoursShell: HouseShell;
}

/**
 * Sizes and shells of a house. U-values given as one number are used as typed on design nights and at the wind of the hour
 * in the year. Shape: plan input, optionally sizes of its own → model. Throws EngineInputError for sizes that do not fit.
 * Source [ASHRAEAPP], [ISO6946].
 */
export function houseModel(input: HousePlanInput, ownGeometry?: HouseGeometry): HouseModel {
  const geometry =
    ownGeometry ??
    houseGeometry(input.shape, {
      ridgeBearingDeg: input.ridgeBearingDeg,
      kneewallHeightM: input.kneewallHeightM,
    });
  const pressurePa = pressureAtAltitudePa(input.site.elevationM);
  return {
    input,
    geometry,
    pressurePa,
    designShell: prepareShell(input, geometry, pressurePa, "asTyped"),
    hoursShell: prepareShell(input, geometry, pressurePa, "atWind"),
  };
}
