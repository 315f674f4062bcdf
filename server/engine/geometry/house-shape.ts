/** Round-arch tunnel: a part of a circle through both feet and the crown, on upright walls of `wallHeightM` (0 for a hoop from the ground). */
export interface RoundArchShape {
  type: "roundArch";
  lengthM: number;
  widthM: number;
  riseM: number;
  wallHeightM: number;
}

/** Gothic-arch tunnel: walls to the eave, each roof half a parabola that bulges `roofBowM` past its chord. */
export interface GothicArchShape {
  type: "gothicArch";
  lengthM: number;
  widthM: number;
  eaveHeightM: number;
  ridgeHeightM: number;
  roofBowM: number;
}

export interface GableShape {
  type: "gable";
  lengthM: number;
  widthM: number;
  eaveHeightM: number;
  ridgeHeightM: number;
}

/** Gutter-connected range of equal gables. */
export interface MultiSpanShape {
  type: "multiSpan";
  lengthM: number;
  spanWidthM: number;
  spanCount: number;
  gutterHeightM: number;
  ridgeHeightM: number;
}

/** Venlo-type range: many narrow spans given by their roof slope. */
export interface VenloShape {
  type: "venlo";
  lengthM: number;
  spanWidthM: number;
  spanCount: number;
  gutterHeightM: number;
  roofSlopeDeg: number;
}

export interface MonoPitchShape {
  type: "monoPitch";
  lengthM: number;
  widthM: number;
  lowEaveM: number;
  highEaveM: number;
}

/** Gable barn with a flat insulated ceiling at the eave and a cold attic above. */
export interface AtticBarnShape {
  type: "atticBarn";
  lengthM: number;
  widthM: number;
  eaveHeightM: number;
  ridgeHeightM: number;
}

export type HouseShape =
  | RoundArchShape
  | GothicArchShape
  | GableShape
  | MultiSpanShape
  | VenloShape
  | MonoPitchShape
  | AtticBarnShape;
