import type { Quantity } from "../../../server/contracts/quantity.ts";
import type { SurveyShape } from "../../../server/contracts/survey.ts";
import { quantitySi } from "../../lib/quantity-value.ts";

const typical = (value: number, unit: "m" | "each" | "deg"): Quantity => ({
  typed: String(Math.round(value * 100) / 100),
  unit,
  origin: "default",
});

interface Known {
  length: Quantity;
  width: Quantity;
  side: Quantity;
  top: Quantity;
}

/** What one shape tells about any other: length, width, height at the side and at the top. */
function known(shape: SurveyShape): Known {
  const several = shape.type === "multiSpan" || shape.type === "venlo";
  const width = several
    ? typical(quantitySi(shape.spanWidth) * quantitySi(shape.spanCount), "m")
    : shape.width;
  switch (shape.type) {
    case "roundArch":
      return {
        length: shape.length,
        width,
        side: shape.wallHeight,
        top: typical(quantitySi(shape.wallHeight) + quantitySi(shape.rise), "m"),
      };
    case "multiSpan":
      return { length: shape.length, width, side: shape.gutterHeight, top: shape.ridgeHeight };
    case "venlo": {
      const rise =
        (quantitySi(shape.spanWidth) / 2) * Math.tan((quantitySi(shape.roofSlope) * Math.PI) / 180);
      return {
        length: shape.length,
        width,
        side: shape.gutterHeight,
        top: typical(quantitySi(shape.gutterHeight) + rise, "m"),
      };
    }
    case "monoPitch":
      return { length: shape.length, width, side: shape.lowEave, top: shape.highEave };
    default:
      return { length: shape.length, width, side: shape.eaveHeight, top: shape.ridgeHeight };
  }
}

/** At least `least` metres, as a typical value where the figure at hand is too small for the new shape. */
function atLeast(quantity: Quantity, least: number): Quantity {
  const value = quantitySi(quantity);
  return Number.isFinite(value) && value >= least ? quantity : typical(least, "m");
}

/** The same house as another shape: figures that still mean the same are kept, the others become typical values. */
export function changeShape(shape: SurveyShape, type: SurveyShape["type"]): SurveyShape {
  if (shape.type === type) return shape;
  const { length, width, side, top } = known(shape);
  const widthM = quantitySi(width);
  const sideM = quantitySi(side);
  const eaveHeight = atLeast(side, 1.7);
  const ridgeHeight = atLeast(top, quantitySi(eaveHeight) + 0.1);
  switch (type) {
    case "roundArch":
      return {
        type,
        length,
        width,
        rise: typical(Math.max(0.5, quantitySi(top) - Math.min(sideM, 1)), "m"),
        wallHeight: sideM <= 1 ? side : typical(1, "m"),
      };
    case "gothicArch":
      return { type, length, width, eaveHeight, ridgeHeight, roofBow: typical(0.05 * widthM, "m") };
    case "gable":
      return { type, length, width, eaveHeight, ridgeHeight };
    case "atticBarn":
      return { type, length, width, eaveHeight, ridgeHeight };
    case "monoPitch":
      return { type, length, width, lowEave: atLeast(side, 2), highEave: atLeast(top, sideM + 0.2) };
    case "multiSpan": {
      const spans = spansOf(shape, widthM, 9.6);
      return {
        type,
        length,
        ...spans,
        gutterHeight: atLeast(side, 2.5),
        ridgeHeight: atLeast(top, Math.max(sideM, 2.5) + 0.5),
      };
    }
    case "venlo": {
      const spans = spansOf(shape, widthM, 4);
      return { type, length, ...spans, gutterHeight: atLeast(side, 4), roofSlope: typical(22, "deg") };
    }
  }
}

function spansOf(
  shape: SurveyShape,
  widthM: number,
  usualM: number,
): { spanWidth: Quantity; spanCount: Quantity } {
  if (shape.type === "multiSpan" || shape.type === "venlo") {
    return { spanWidth: shape.spanWidth, spanCount: shape.spanCount };
  }
  const count = Math.max(1, Math.round(widthM / usualM));
  return { spanWidth: typical(Math.max(2, widthM / count), "m"), spanCount: typical(count, "each") };
}
