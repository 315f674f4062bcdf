import { requireInRange } from "../errors.ts";

/**
 * Sun on the flat under a clear sky, from its elevation alone.
 *
 * Units degrees → W/m²; 0 when the sun is down. Valid −90 to 90°. Errors EngineInputError. Source [HAURWITZ1945].
 */
export function haurwitzWM2(elevationDeg: number): number {
  requireInRange("elevationDeg", elevationDeg, -90, 90, "°");
  if (elevationDeg <= 0) return 0;
  const sine = Math.sin((elevationDeg * Math.PI) / 180);
  return 1098 * sine * Math.exp(-0.059 / sine);
}

export interface ClearSkyInput {
  zenithDeg: number;
  /** Of the sea-level air, corrected for pressure. */
  airMass: number;
  linkeTurbidity: number;
  altitudeM: number;
  extraterrestrialWM2: number;
}

/**
 * Sun under a clear sky of known turbidity.
 *
 * Units degrees, m, W/m² → W/m². Valid zenith 0 to 90°, air mass 0.4 to 40, turbidity 1 to 10, altitude −500 to 6000 m.
 * Errors EngineInputError. Source [INEICHEN-PEREZ2002].
 */
export function ineichenPerez(input: ClearSkyInput): { ghiWM2: number; dniWM2: number; dhiWM2: number } {
  const { zenithDeg, airMass, linkeTurbidity, altitudeM, extraterrestrialWM2 } = input;
  requireInRange("zenithDeg", zenithDeg, 0, 90, "°");
  requireInRange("airMass", airMass, 0.4, 40);
  requireInRange("linkeTurbidity", linkeTurbidity, 1, 10);
  requireInRange("altitudeM", altitudeM, -500, 6000, "m");
  const high = Math.exp(-altitudeM / 8000);
  const low = Math.exp(-altitudeM / 1250);
  const scale = 5.09e-5 * altitudeM + 0.868;
  const depth = 3.92e-5 * altitudeM + 0.0387;
  const cosine = Math.cos((zenithDeg * Math.PI) / 180);
  const turbid = linkeTurbidity - 1;
  const ghiWM2 = scale * extraterrestrialWM2 * cosine * Math.exp(-depth * airMass * (high + low * turbid));
  const beam = (0.664 + 0.163 / high) * extraterrestrialWM2 * Math.exp(-0.09 * airMass * turbid);
  const limit =
    (ghiWM2 * (1 - (0.1 - 0.2 * Math.exp(-linkeTurbidity)) / (0.1 + 0.882 / high))) / Math.max(1e-6, cosine);
  const dniWM2 = Math.max(0, Math.min(beam, limit));
  return { ghiWM2, dniWM2, dhiWM2: Math.max(0, ghiWM2 - dniWM2 * cosine) };
}
