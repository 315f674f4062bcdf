import type { OutsideView } from "./view.ts";

/** What the weather is around the house in one hour. */
export interface OutsideHour {
  airTempC: number;
  /** Temperature of the sky proper; equal to the air where a cover is given as one U-value. */
  skyTempC: number;
  windMS: number;
  /** Snow lies on everything flatter than 60°. */
  snow: boolean;
}

/** How far shut the screen is: 0 open, 1 shut. */
export type ScreenPosition = 0 | 1;

/** Heat through 1 m² of a surface. */
export interface SurfaceFlux {
  /** Leaving the room. */
  lossWM2: number;
  /** Reaching the sky by radiation; the rest, less what the cover takes up from the sun, reaches air and ground. */
  toSkyWM2: number;
  /** Faces from the room outwards, °C, two for each layer. */
  faceTempsC: number[];
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
  layerNames: string[];
  /** Share of the sun on the surface that enters the room, the closed screen not counted. */
  solarTransmittance: number;
  /** Share of the sun that still enters with the screen shut. */
  screenSolarShare: number;
  flux(insideTempC: number, outside: OutsideHour, screen: ScreenPosition, sunWM2: number): SurfaceFlux;
}
