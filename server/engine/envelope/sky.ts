import { ZERO_CELSIUS_K } from "../constants.ts";
import { requireInRange } from "../errors.ts";

export const skyModels = [
  "berdahlMartin",
  "swinbank",
  "brunt",
  "brutsaert",
  "berdahlFromberg",
  "clarkAllen",
  "idsoJackson",
  "prata",
] as const;
export type SkyModel = (typeof skyModels)[number];

export interface SkyInput {
  airTempC: number;
  dewPointC: number;
  /** Default Berdahl and Martin. */
  model?: SkyModel;
  /** Hours from solar midnight; left out, the daily term of Berdahl and Martin is left out as well. */
  solarHour?: number;
  /** For the pressure term of Berdahl and Martin; left out, the term is left out. */
  pressurePa?: number;
}

/** Vapour pressure over water by Tetens' formula, hPa, as the sky formulas were fitted with. */
function tetensHpa(dewPointC: number): number {
  return 6.108 * Math.exp((17.27 * dewPointC) / (dewPointC + 237.3));
}

/**
 * Emissivity of a clear sky, so that the sky sends down emissivity × σ T⁴ of the air at screen height.
 *
 * Units °C, h, Pa → 0 to 1 (values above 1 are cut at 1). Valid air −60 to 50 °C, dew point not above the air.
 * Errors EngineInputError. Source [BERDAHL-MARTIN1984] by default, the others [SKY].
 */
export function skyEmissivity({
  airTempC,
  dewPointC,
  model = "berdahlMartin",
  solarHour,
  pressurePa,
}: SkyInput): number {
  requireInRange("airTempC", airTempC, -60, 50, "°C");
  requireInRange("dewPointC", dewPointC, -80, airTempC + 1e-9, "°C");
  const kelvin = airTempC + ZERO_CELSIUS_K;
  const vapourHpa = tetensHpa(dewPointC);
  return Math.min(1, clearSky[model]({ kelvin, airTempC, dewPointC, vapourHpa, solarHour, pressurePa }));
}

interface SkyState {
  kelvin: number;
  airTempC: number;
  dewPointC: number;
  vapourHpa: number;
  solarHour: number | undefined;
  pressurePa: number | undefined;
}

const clearSky: Record<SkyModel, (state: SkyState) => number> = {
  berdahlMartin({ dewPointC, solarHour, pressurePa }) {
    if (solarHour !== undefined) requireInRange("solarHour", solarHour, 0, 24, "h");
    const daily = solarHour === undefined ? 0 : 0.013 * Math.cos((2 * Math.PI * solarHour) / 24);
    const height = pressurePa === undefined ? 0 : 0.00012 * (pressurePa / 100 - 1000);
    return 0.711 + 0.56 * (dewPointC / 100) + 0.73 * (dewPointC / 100) ** 2 + daily + height;
  },
  swinbank: ({ kelvin }) => ((0.0552 * kelvin ** 1.5) / kelvin) ** 4,
  brunt: ({ vapourHpa }) => 0.52 + 0.065 * Math.sqrt(vapourHpa),
  brutsaert: ({ vapourHpa, kelvin }) => 1.24 * (vapourHpa / kelvin) ** (1 / 7),
  berdahlFromberg: ({ dewPointC, solarHour = 0 }) =>
    solarHour > 6 && solarHour < 18 ? 0.727 + 0.006 * dewPointC : 0.741 + 0.0062 * dewPointC,
  clarkAllen: ({ dewPointC }) => 0.787 + 0.764 * Math.log((dewPointC + ZERO_CELSIUS_K) / 273),
  idsoJackson: ({ kelvin }) => 1 - 0.261 * Math.exp(-7.77e-4 * (273 - kelvin) ** 2),
  prata({ vapourHpa, kelvin }) {
    const water = (46.5 * vapourHpa) / kelvin;
    return 1 - (1 + water) * Math.exp(-Math.sqrt(1.2 + 3 * water));
  },
};

/**
 * Emissivity of a sky of which `cloudFrac` is covered by low or middle cloud.
 *
 * Units 0 to 1 → 0 to 1. Errors EngineInputError. Source [UNSWORTH1975].
 */
export function cloudySkyEmissivity(clearEmissivity: number, cloudFrac: number): number {
  requireInRange("clearEmissivity", clearEmissivity, 0, 1);
  requireInRange("cloudFrac", cloudFrac, 0, 1);
  return (1 - 0.84 * cloudFrac) * clearEmissivity + 0.84 * cloudFrac;
}

/**
 * Temperature of a black sky that sends down the same radiation.
 *
 * Units °C, 0 to 1 → °C. Errors EngineInputError. Source: definition of sky emissivity. Never use the result with an emissivity again.
 */
export function skyTempFromEmissivityC(airTempC: number, emissivity: number): number {
  requireInRange("airTempC", airTempC, -60, 50, "°C");
  requireInRange("emissivity", emissivity, 0.05, 1);
  return emissivity ** 0.25 * (airTempC + ZERO_CELSIUS_K) - ZERO_CELSIUS_K;
}

/** Sky temperature for air, dew point and cloud in one step. Units and errors as the functions it joins. Source [BERDAHL-MARTIN1984], [UNSWORTH1975]. */
export function skyTemperatureC(input: SkyInput & { cloudFrac?: number }): number {
  const clear = skyEmissivity(input);
  return skyTempFromEmissivityC(input.airTempC, cloudySkyEmissivity(clear, input.cloudFrac ?? 0));
}

/**
 * Cloud cover from the monthly clearness index, through the sunshine share (Ångström, a 0.25, b 0.50).
 *
 * Units 0 to 1 → 0 to 1. Valid 0 to 0.9; the result is bounded because the relation is. Errors EngineInputError.
 * Source [SKY], coefficients from memory.
 */
export function cloudFromClearnessFrac(clearness: number): number {
  requireInRange("clearness", clearness, 0, 0.9);
  return Math.min(1, Math.max(0, 1 - (clearness - 0.25) / 0.5));
}

export interface ViewFactors {
  skyFrac: number;
  /** Sky near the horizon, at air temperature. */
  airFrac: number;
  groundFrac: number;
}

/**
 * What a tilted plane sees. `isotropic` knows sky and ground; `walton` gives the part of the sky near the horizon to the air.
 *
 * Units degrees → shares that add to 1. Valid tilt 0 to 180°. Errors EngineInputError. Source [TARP-1983].
 */
export function viewFactors(tiltDeg: number, split: "isotropic" | "walton" = "isotropic"): ViewFactors {
  requireInRange("tiltDeg", tiltDeg, 0, 180, "°");
  const sky = (1 + Math.cos((tiltDeg * Math.PI) / 180)) / 2;
  const share = split === "walton" ? Math.sqrt(sky) : 1;
  return { skyFrac: sky * share, airFrac: sky * (1 - share), groundFrac: 1 - sky };
}
