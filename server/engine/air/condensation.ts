import { requireInRange } from "../errors.ts";
import { dewPointC } from "./moist-air.ts";
import { saturationPressurePa } from "./saturation.ts";

export interface DampRoom {
  insideTempC: number;
  humidityFrac: number;
  outdoorTempC: number;
}

function check(room: DampRoom): void {
  requireInRange("insideTempC", room.insideTempC, -30, 45, "°C");
  requireInRange("humidityFrac", room.humidityFrac, 0.05, 1);
  requireInRange("outdoorTempC", room.outdoorTempC, -70, 45, "°C");
}

/**
 * Temperature of the inner face of a wall, ceiling or window.
 *
 * Units °C, m²K/W → °C. `resistanceM2KW` is air to air, both films included. Valid resistance from the inside film's own up to
 * 50 m²K/W. Errors EngineInputError. Source [EN-13788], layers in series.
 */
export function insideFaceTempC(
  insideTempC: number,
  outdoorTempC: number,
  resistanceM2KW: number,
  insideFilmM2KW: number,
): number {
  requireInRange("insideTempC", insideTempC, -60, 60, "°C");
  requireInRange("outdoorTempC", outdoorTempC, -70, 60, "°C");
  requireInRange("insideFilmM2KW", insideFilmM2KW, 0.01, 1, "m²K/W");
  requireInRange("resistanceM2KW", resistanceM2KW, insideFilmM2KW, 50, "m²K/W");
  return insideTempC - (insideFilmM2KW / resistanceM2KW) * (insideTempC - outdoorTempC);
}

export interface DryLimit {
  dewPointC: number;
  /** Least resistance air to air that keeps the face above the dew point, m²K/W; 0 where even bare sheet stays dry. */
  leastResistanceM2KW: number;
  /** Least share of the temperature drop left at the inner face, 0 to 1 (the temperature factor of the face). */
  leastFaceFactorFrac: number;
}

/**
 * Least insulation on which no water condenses.
 *
 * Units °C, 0 to 1, m²K/W → m²K/W. Corners and framing need about a quarter more. At 100 % humidity no insulation is enough: the
 * least resistance is then infinite. Valid −30 to 45 °C inside. Errors EngineInputError. Source [EN-13788].
 */
export function dryLimit(room: DampRoom, insideFilmM2KW: number): DryLimit {
  check(room);
  requireInRange("insideFilmM2KW", insideFilmM2KW, 0.01, 1, "m²K/W");
  const dew = dewPointC(room.insideTempC, room.humidityFrac);
  const drop = room.insideTempC - room.outdoorTempC;
  if (drop <= 0 || dew <= room.outdoorTempC)
    return { dewPointC: dew, leastResistanceM2KW: 0, leastFaceFactorFrac: 0 };
  const allowed = room.insideTempC - dew;
  return {
    dewPointC: dew,
    leastResistanceM2KW: allowed < 1e-6 ? Number.POSITIVE_INFINITY : (insideFilmM2KW * drop) / allowed,
    leastFaceFactorFrac: Math.min(1, (dew - room.outdoorTempC) / drop),
  };
}

/**
 * Highest humidity of the room at which a wall stays dry, 0 to 1.
 *
 * Units °C, m²K/W → 0 to 1. Errors EngineInputError. Source [EN-13788]: saturation at the face over saturation in the room.
 */
export function dryHumidityFrac(
  insideTempC: number,
  outdoorTempC: number,
  resistanceM2KW: number,
  insideFilmM2KW: number,
): number {
  const face = insideFaceTempC(insideTempC, outdoorTempC, resistanceM2KW, insideFilmM2KW);
  return Math.min(1, saturationPressurePa(face) / saturationPressurePa(insideTempC));
}
