import { SOLAR_CONSTANT_WM2 } from "../constants.ts";
import { requireInRange } from "../errors.ts";
import { relativeAirMass } from "./air-mass.ts";
import { incidenceCosine } from "./incidence.ts";
import { perezDiffuse } from "./perez.ts";
import type { SunPosition } from "./sun-position.ts";

export const diffuseModels = ["hayDavies", "isotropic", "reindl", "klucher", "perez"] as const;
export type DiffuseModel = (typeof diffuseModels)[number];

/** Sun of one moment on the flat, W/m². */
export interface FlatIrradiance {
  ghiWM2: number;
  dniWM2: number;
  dhiWM2: number;
  /** Outside the air, across the beam. */
  extraterrestrialWM2?: number;
}

export interface PlaneIrradiance {
  beamWM2: number;
  skyDiffuseWM2: number;
  groundWM2: number;
  totalWM2: number;
  incidenceCosine: number;
}

export interface PlaneOptions {
  tiltDeg: number;
  azimuthDeg: number;
  /** Reflectance of the ground, 0.2 for soil and grass, 0.6 to 0.8 for snow. */
  groundReflectance?: number;
  model?: DiffuseModel;
}

/** The sine of the sun's elevation is not let below this, so that the ratio to the flat stays finite at the horizon. */
const LEAST_SINE = 0.01745;

/**
 * Sun on any plane: beam, sky and what the ground reflects.
 *
 * Units W/m², degrees. Valid irradiance 0 to 1500 W/m², tilt 0 to 180°, reflectance 0 to 1. Nothing is negative.
 * Errors EngineInputError. Source [HAY-DAVIES1980] by default; [REINDL1990], [KLUCHER1979], [PEREZ1990], [DUFFIE-BECKMAN].
 */
export function planeIrradiance(
  flat: FlatIrradiance,
  sun: SunPosition,
  options: PlaneOptions,
): PlaneIrradiance {
  const { tiltDeg, azimuthDeg, groundReflectance = 0.2, model = "hayDavies" } = options;
  requireInRange("ghiWM2", flat.ghiWM2, 0, 2000, "W/m²");
  requireInRange("dniWM2", flat.dniWM2, 0, 2000, "W/m²");
  requireInRange("dhiWM2", flat.dhiWM2, 0, 2000, "W/m²");
  requireInRange("groundReflectance", groundReflectance, 0, 1);
  const cosine = incidenceCosine(sun, tiltDeg, azimuthDeg);
  const cosTilt = Math.cos((tiltDeg * Math.PI) / 180);
  const beamWM2 = flat.dniWM2 * cosine;
  const skyDiffuseWM2 = Math.max(0, skyDiffuse(model, flat, sun, cosine, tiltDeg));
  const groundWM2 = (flat.ghiWM2 * groundReflectance * (1 - cosTilt)) / 2;
  return {
    beamWM2,
    skyDiffuseWM2,
    groundWM2,
    totalWM2: beamWM2 + skyDiffuseWM2 + groundWM2,
    incidenceCosine: cosine,
  };
}

function skyDiffuse(
  model: DiffuseModel,
  flat: FlatIrradiance,
  sun: SunPosition,
  cosine: number,
  tiltDeg: number,
): number {
  const tilt = (tiltDeg * Math.PI) / 180;
  const even = (1 + Math.cos(tilt)) / 2;
  const extraterrestrial = flat.extraterrestrialWM2 ?? SOLAR_CONSTANT_WM2;
  const clear = Math.min(1, flat.dniWM2 / extraterrestrial);
  const sine = Math.max(LEAST_SINE, Math.sin((sun.elevationDeg * Math.PI) / 180));
  const ratio = cosine / sine;
  switch (model) {
    case "isotropic":
      return flat.dhiWM2 * even;
    case "hayDavies":
      return flat.dhiWM2 * (clear * ratio + (1 - clear) * even);
    case "reindl": {
      const beamShare = flat.ghiWM2 > 0 ? Math.min(1, (flat.dniWM2 * sine) / flat.ghiWM2) : 0;
      const horizon = 1 + Math.sqrt(beamShare) * Math.sin(tilt / 2) ** 3;
      return flat.dhiWM2 * (clear * ratio + (1 - clear) * even * horizon);
    }
    case "klucher": {
      const overcast = flat.ghiWM2 > 0 ? 1 - (flat.dhiWM2 / flat.ghiWM2) ** 2 : 0;
      const zenithSine = Math.cos((sun.elevationDeg * Math.PI) / 180);
      const horizon = 1 + overcast * Math.sin(tilt / 2) ** 3;
      return flat.dhiWM2 * even * horizon * (1 + overcast * cosine ** 2 * zenithSine ** 3);
    }
    case "perez":
      return perezDiffuse({
        dhiWM2: flat.dhiWM2,
        dniWM2: flat.dniWM2,
        zenithDeg: 90 - sun.elevationDeg,
        airMass: relativeAirMass(90 - Math.max(0, sun.elevationDeg)),
        extraterrestrialWM2: extraterrestrial,
        incidenceCosine: cosine,
        tiltDeg,
      });
  }
}
