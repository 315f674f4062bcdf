/** A layer of a cover, listed from the room outwards. Solar and longwave properties are fractions of 1. */
export interface CoverLayer {
  name: string;
  /** Thermal resistance from face to face, m² K/W; 0 for films, whose two faces share one temperature. */
  resistanceM2KW: number;
  solarTransmittance: number;
  /** Solar reflectance of the face towards the sky. */
  solarReflectance: number;
  /** Solar reflectance of the face towards the room; left out, as the other. */
  solarReflectanceIn?: number;
  /** Longwave emissivity of the face towards the room and of the face towards the sky. */
  emissivityIn: number;
  emissivityOut: number;
  /** Longwave transmittance, the same both ways; 0 for glass and solid walls. */
  longwaveTransmittance: number;
}

/** How the air between two layers moves. */
export type GapKind = "still" | "inflated" | "vented" | "fixed";

/** The air between two layers. */
export interface CoverGap {
  /**
   * `still`: closed air layer; `inflated`: two films kept apart by a small blower; `vented`: open to the weather;
   * `fixed`: a given coefficient.
   */
  kind: GapKind;
  /** Not needed where the coefficient is given. */
  thicknessM: number;
  /** For `fixed`: convective coefficient from face to face, W/(m² K). */
  coefficientWM2K: number;
  /** Air that slips past the layer below the gap out of the space below it, m³/(h m²), as past the edge of a screen. */
  airLeakageM3HM2: number;
  /** For `inflated` and `vented`: outside air blown or drawn through the gap, m³/(h m²); left out, none. */
  outsideAirM3HM2?: number;
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
  /** Sun absorbed in each layer, W/m²; left out, none. A thick layer takes half on each face. */
  absorbedSolarWM2?: number[];
  /** Vapour pressure of the room; given, water that condenses on the inner face gives its heat to it. */
  vapourPressurePa?: number;
}

/** What a cover does at one moment. */
export interface CoverBalance {
  /** Inner and outer face of each layer from the room outwards; films have one temperature twice. */
  faceTempsC: number[];
  /** Out of the room, W/m²: by air, by radiation (also straight through films), by condensing water. */
  fromRoomConvectionWM2: number;
  fromRoomRadiationWM2: number;
  fromRoomLatentWM2: number;
  /** All of it. */
  fromRoomWM2: number;
  /** Of the radiation out of the room, what passes every layer without being taken up by one. */
  straightThroughWM2: number;
  /** Into the open, W/m². Their sum is what left the room plus the absorbed sun. */
  toOutsideAirWM2: number;
  toSkyWM2: number;
  toGroundWM2: number;
  /** From the room for one kelvin between both airs; 0 where they are equally warm. */
  uValueWM2K: number;
  iterations: number;
  /** Largest imbalance of any node, W/m². */
  residualWM2: number;
}

/** The figures of a balance that an hourly loop needs, in an object that is used again by the next call. */
export interface CoverFlows {
  fromRoomWM2: number;
  toOutsideAirWM2: number;
  toSkyWM2: number;
  toGroundWM2: number;
  innerFaceC: number;
  outerFaceC: number;
  iterations: number;
}
