import { requireInRange } from "../errors.ts";
import type { SunPosition } from "./sun-position.ts";

const radians = (degreesValue: number) => (degreesValue * Math.PI) / 180;

/**
 * Cosine of the angle between the beam and the normal of a plane; 0 when the sun is behind it or below the horizon.
 *
 * Units degrees → 0 to 1. Valid tilt 0 to 180°, any azimuth. Errors EngineInputError. Source [DUFFIE-BECKMAN] equation 1.6.3.
 */
export function incidenceCosine(sun: SunPosition, tiltDeg: number, azimuthDeg: number): number {
  requireInRange("tiltDeg", tiltDeg, 0, 180, "°");
  requireInRange("azimuthDeg", azimuthDeg, -360, 720, "°");
  if (sun.elevationDeg <= 0) return 0;
  const elevation = radians(sun.elevationDeg);
  const tilt = radians(tiltDeg);
  const cosine =
    Math.cos(tilt) * Math.sin(elevation) +
    Math.sin(tilt) * Math.cos(elevation) * Math.cos(radians(sun.azimuthDeg - azimuthDeg));
  return Math.max(0, cosine);
}
