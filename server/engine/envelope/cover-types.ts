/** A layer of a cover, listed from the room outwards. Solar and longwave properties are fractions of 1. */
export interface CoverLayer {
  name: string;
  /** Thermal resistance from face to face, m² K/W; 0 for films, whose two faces share one temperature. */
  resistanceM2KW: number;
  solarTransmittance: number;
  /** Solar reflectance of the face towards the sky. */
  solarReflectance: number;
  /** Longwave emissivity of the face towards the room and of the face towards the sky. */
  emissivityIn: number;
  emissivityOut: number;
  /** Longwave transmittance, the same both ways; 0 for glass and solid walls. */
  longwaveTransmittance: number;
}

/** The air between two layers. */
export interface CoverGap {
  /** `still`: closed air layer; `fixed`: a given coefficient. */
  kind: "still" | "fixed";
  thicknessM: number;
  /** For `fixed`: convective coefficient, W/(m² K). */
  coefficientWM2K: number;
  /** Air that passes the layer above and below the gap, m³/(h m²): carries heat past a screen. */
  airLeakageM3HM2: number;
}

/** Layers from the room outwards, with one gap between each two. */
export interface CoverStack {
  layers: CoverLayer[];
  gaps: CoverGap[];
}

/** What stands on both sides of a cover at one moment. */
export interface CoverBoundary {
  insideAirC: number;
  /** Temperature of floor, crop or stock as seen from the cover. */
  insideRadiantC: number;
  outsideAirC: number;
  skyC: number;
  /** Ground and surroundings as seen from outside. */
  groundC: number;
  skyViewFrac: number;
  tiltDeg: number;
  /** Convective, W/(m² K). */
  outsideCoefficientWM2K: number;
  /** Convective; left out, natural convection by tilt. */
  insideCoefficientWM2K?: number;
  /** Sun absorbed in each layer, W/m²; left out, none. */
  absorbedSolarWM2?: number[];
  /** Vapour pressure of the room; given, water that condenses on the inner face gives its heat to it. */
  vapourPressurePa?: number;
}
