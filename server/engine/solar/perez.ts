import { requireInRange } from "../errors.ts";

/** Upper clearness bound of each bin and its six coefficients. Source [PEREZ1990], all-sites composite. */
const BINS: readonly (readonly [number, number, number, number, number, number, number])[] = [
  [1.065, -0.008, 0.588, -0.062, -0.06, 0.072, -0.022],
  [1.23, 0.13, 0.683, -0.151, -0.019, 0.066, -0.029],
  [1.5, 0.33, 0.487, -0.221, 0.055, -0.064, -0.026],
  [1.95, 0.568, 0.187, -0.295, 0.109, -0.152, -0.014],
  [2.8, 0.873, -0.392, -0.362, 0.226, -0.462, 0.001],
  [4.5, 1.132, -1.237, -0.412, 0.288, -0.823, 0.056],
  [6.2, 1.06, -1.6, -0.359, 0.264, -1.127, 0.131],
  [Number.POSITIVE_INFINITY, 0.678, -0.327, -0.25, 0.156, -1.377, 0.251],
];

export interface PerezInput {
  dhiWM2: number;
  dniWM2: number;
  zenithDeg: number;
  airMass: number;
  extraterrestrialWM2: number;
  incidenceCosine: number;
  tiltDeg: number;
}

/**
 * Sky diffuse on a plane with brighter rings around sun and horizon. The horizon part may be negative and is kept.
 *
 * Units W/m², degrees → W/m². Valid zenith 0 to 180°, tilt 0 to 180°. Errors EngineInputError. Source [PEREZ1990].
 */
export function perezDiffuse(input: PerezInput): number {
  const { dhiWM2, dniWM2, zenithDeg, airMass, extraterrestrialWM2, incidenceCosine, tiltDeg } = input;
  requireInRange("zenithDeg", zenithDeg, 0, 180, "°");
  requireInRange("tiltDeg", tiltDeg, 0, 180, "°");
  if (dhiWM2 <= 0) return 0;
  const zenith = (zenithDeg * Math.PI) / 180;
  const tilt = (tiltDeg * Math.PI) / 180;
  const cubed = 1.041 * zenith ** 3;
  const clearness = ((dhiWM2 + dniWM2) / dhiWM2 + cubed) / (1 + cubed);
  const brightness = (dhiWM2 * airMass) / extraterrestrialWM2;
  const bin = BINS.find(([upper]) => clearness < upper) ?? BINS[BINS.length - 1];
  if (bin === undefined) return 0;
  const [, f11, f12, f13, f21, f22, f23] = bin;
  const aroundSun = Math.max(0, f11 + f12 * brightness + f13 * zenith);
  const horizon = f21 + f22 * brightness + f23 * zenith;
  const ratio = Math.max(0, incidenceCosine) / Math.max(Math.cos((85 * Math.PI) / 180), Math.cos(zenith));
  return (
    dhiWM2 * ((1 - aroundSun) * ((1 + Math.cos(tilt)) / 2) + aroundSun * ratio + horizon * Math.sin(tilt))
  );
}
