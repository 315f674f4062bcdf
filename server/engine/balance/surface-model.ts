import type { OutsideView } from "./view.ts";

/** What the weather is around the house in one hour. */
export interface OutsideHour {
  airTempC: number;
  /** Temperature of the sky proper. A cover given as one U-value does not look at it. */
  skyTempC: number;
  /** At the eave. */
  windMS: number;
  /** Wet snow lies on the roofs. */
  snow: boolean;
}

/** Whether the screen is shut. */
export type ScreenPosition = "open" | "shut";

/** Heat through 1 m² of a surface. */
export interface SurfaceFlux {
  /** Leaving the room. */
  lossWM2: number;
  /** Reaching the sky by radiation; the rest, less what the cover takes up from the sun, reaches air and ground. */
  toSkyWM2: number;
  /** Faces from the room outwards, °C. */
  faceTempsC: number[];
}

/** Surfaces that pass the same heat for each square metre, because they are made alike and see the same share of sky. */
export interface FluxGroup {
  key: string;
  areaM2: number;
  layerNames: string[];
  flux(insideTempC: number, outside: OutsideHour, screen: ScreenPosition, sunWM2: number): SurfaceFlux;
}

/** One surface of a house, made ready for many hours. */
export interface SurfaceModel {
  id: string;
  label: string;
  role: string;
  areaM2: number;
  tiltDeg: number;
  azimuthDeg: number;
  view: OutsideView;
  assemblyName: string;
  /** Index into the groups of the shell. */
  group: number;
  /** Share of the sun on the surface that enters the room, the closed screen not counted. */
  solarTransmittance: number;
  /** Share of that which still enters with the screen shut. */
  screenSolarShare: number;
}
