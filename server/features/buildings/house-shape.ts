import { siValue } from "../../contracts/quantity.ts";
import type { SurveyShape } from "../../contracts/survey.ts";
import type { HouseShape } from "../../engine/geometry/house-shape.ts";

/** The measured shape as the engine takes it, in metres and degrees. */
export function houseShapeOf(shape: SurveyShape): HouseShape {
  const lengthM = siValue(shape.length);
  switch (shape.type) {
    case "roundArch":
      return {
        type: "roundArch",
        lengthM,
        widthM: siValue(shape.width),
        riseM: siValue(shape.rise),
        wallHeightM: siValue(shape.wallHeight),
      };
    case "gothicArch":
      return {
        type: "gothicArch",
        lengthM,
        widthM: siValue(shape.width),
        eaveHeightM: siValue(shape.eaveHeight),
        ridgeHeightM: siValue(shape.ridgeHeight),
        roofBowM: siValue(shape.roofBow),
      };
    case "gable":
    case "atticBarn":
      return {
        type: shape.type,
        lengthM,
        widthM: siValue(shape.width),
        eaveHeightM: siValue(shape.eaveHeight),
        ridgeHeightM: siValue(shape.ridgeHeight),
      };
    case "multiSpan":
      return {
        type: "multiSpan",
        lengthM,
        spanWidthM: siValue(shape.spanWidth),
        spanCount: siValue(shape.spanCount),
        gutterHeightM: siValue(shape.gutterHeight),
        ridgeHeightM: siValue(shape.ridgeHeight),
      };
    case "venlo":
      return {
        type: "venlo",
        lengthM,
        spanWidthM: siValue(shape.spanWidth),
        spanCount: siValue(shape.spanCount),
        gutterHeightM: siValue(shape.gutterHeight),
        roofSlopeDeg: siValue(shape.roofSlope),
      };
    case "monoPitch":
      return {
        type: "monoPitch",
        lengthM,
        widthM: siValue(shape.width),
        lowEaveM: siValue(shape.lowEave),
        highEaveM: siValue(shape.highEave),
      };
  }
}
