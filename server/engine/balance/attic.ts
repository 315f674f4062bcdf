import { airHeatWK } from "./air-heat.ts";
import { findZero } from "./find-zero.ts";
import type { OutsideHour, SurfaceFlux } from "./surface-model.ts";

/** Air changes of a ventilated attic, 1/h. Source [ATTICAIR]. */
export const ATTIC_AIR_CHANGES_PER_HOUR = 3;

/** A part of the attic's own shell: roof slopes and the gables above the ceiling. */
export interface AtticPart {
  areaM2: number;
  flux(atticTempC: number, outside: OutsideHour, sunWM2: number): SurfaceFlux;
}

export interface AtticSpace {
  ceilingAreaM2: number;
  ceilingUValueWM2K: number;
  volumeM3: number;
  pressurePa: number;
  parts: readonly AtticPart[];
}

/**
 * Heat through 1 m² of a ceiling under a cold attic: the attic settles where the ceiling, the roof and the attic's own air
 * are in balance.
 * Shape: attic, inside °C, hour, sun on the roof W/m² → flux of the ceiling; its last face is the attic's air. Source [ISO6946], [ATTICAIR].
 */
export function ceilingFlux(
  attic: AtticSpace,
  insideTempC: number,
  outside: OutsideHour,
  sunWM2: number,
): SurfaceFlux {
  const airWK = airHeatWK(attic.volumeM3 * ATTIC_AIR_CHANGES_PER_HOUR, attic.pressurePa);
  const intoAtticW = (tempC: number) => attic.ceilingUValueWM2K * attic.ceilingAreaM2 * (insideTempC - tempC);
  const throughRoofW = (tempC: number) =>
    attic.parts.reduce((sum, part) => sum + part.areaM2 * part.flux(tempC, outside, sunWM2).lossWM2, 0);
  const outOfAtticW = (tempC: number) => throughRoofW(tempC) + airWK * (tempC - outside.airTempC);
  const low = Math.min(insideTempC, outside.airTempC) - 40;
  const high = Math.max(insideTempC, outside.airTempC) + 60;
  const atticTempC = findZero((tempC) => outOfAtticW(tempC) - intoAtticW(tempC), {
    low,
    high,
    guess: outside.airTempC + 0.15 * (insideTempC - outside.airTempC),
  });
  const skyW = attic.parts.reduce(
    (sum, part) => sum + part.areaM2 * part.flux(atticTempC, outside, sunWM2).toSkyWM2,
    0,
  );
  const lossWM2 = attic.ceilingUValueWM2K * (insideTempC - atticTempC);
  // The roof may draw heat from the outside air and pass it to the sky; only the room's own share is booked to the sky.
  const outW = outOfAtticW(atticTempC);
  const skyShare = outW > 0 ? Math.min(1, Math.max(0, skyW / outW)) : 0;
  // ISO 6946 counts 0.10 m² K/W on each side of a ceiling.
  return {
    lossWM2,
    toSkyWM2: lossWM2 * skyShare,
    faceTempsC: [insideTempC - 0.1 * lossWM2, atticTempC + 0.1 * lossWM2, atticTempC],
  };
}
