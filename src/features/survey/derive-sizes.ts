import type { Quantity } from "../../../server/contracts/quantity.ts";
import type { Survey, SurveyShape } from "../../../server/contracts/survey.ts";
import { EngineInputError, type InputErrorDetail } from "../../../server/engine/errors.ts";
import { type HouseGeometry, houseGeometry } from "../../../server/engine/geometry/house-geometry.ts";
import type { HouseShape } from "../../../server/engine/geometry/house-shape.ts";
import { type UnitKind, type UnitSystem, units } from "../../../server/engine/units.ts";
import { text } from "../../lib/format.ts";
import { quantitySi } from "../../lib/quantity-value.ts";

export type Derived = { sizes: HouseGeometry; problem: null } | { sizes: null; problem: string };

/** What people call the engine's arguments. */
const measures: Record<string, { label: string; kind: UnitKind }> = {
  lengthM: { label: "Length", kind: "length" },
  widthM: { label: "Width", kind: "length" },
  riseM: { label: "Rise of the arch", kind: "length" },
  wallHeightM: { label: "Upright wall", kind: "length" },
  eaveHeightM: { label: "Eave height", kind: "length" },
  ridgeHeightM: { label: "Ridge height", kind: "length" },
  roofBowM: { label: "Roof bow", kind: "length" },
  spanWidthM: { label: "Width of one span", kind: "length" },
  spanCount: { label: "Number of spans", kind: "count" },
  gutterHeightM: { label: "Gutter height", kind: "length" },
  roofSlopeDeg: { label: "Roof slope", kind: "angle" },
  lowEaveM: { label: "Low side", kind: "length" },
  highEaveM: { label: "High side", kind: "length" },
  kneewallHeightM: { label: "Kneewall", kind: "length" },
  ridgeBearingDeg: { label: "Bearing of the ridge", kind: "angle" },
};

/** A surveyed shape with its measures in SI, named as the engine names them. */
export function houseShapeOf(shape: SurveyShape): HouseShape {
  const { type, ...answers } = shape;
  const suffix = (key: string) =>
    key === "spanCount" ? key : key === "roofSlope" ? "roofSlopeDeg" : `${key}M`;
  const inSi = Object.entries(answers).map(([key, quantity]) => [
    suffix(key),
    quantitySi(quantity as Quantity),
  ]);
  return { type, ...Object.fromEntries(inSi) } as HouseShape;
}

const typed = (quantity: Quantity) => `${quantity.typed} ${units[quantity.unit].symbol}`.trim();

/** A top that is not above the side it stands on: the commonest slip, said with what was typed. */
function heightsProblem(shape: SurveyShape): string | null {
  const pairs: [string, Quantity, string, Quantity][] =
    "ridgeHeight" in shape
      ? "gutterHeight" in shape
        ? [["Ridge", shape.ridgeHeight, "gutter", shape.gutterHeight]]
        : [["Ridge", shape.ridgeHeight, "eave", shape.eaveHeight]]
      : shape.type === "monoPitch"
        ? [["High side", shape.highEave, "low side", shape.lowEave]]
        : [];
  for (const [top, topQuantity, side, sideQuantity] of pairs) {
    const slack = shape.type === "monoPitch" ? 0 : 1e-9;
    if (quantitySi(topQuantity) < quantitySi(sideQuantity) + slack) {
      return `${top} must be higher than the ${side} (${typed(sideQuantity)}). You typed ${typed(topQuantity)}.`;
    }
  }
  return null;
}

function engineProblem(detail: InputErrorDetail, system: UnitSystem): string {
  const measure = measures[detail.quantity];
  const label = measure?.label ?? detail.quantity;
  if (detail.reason === "notFinite") return `${label} is not a number yet.`;
  const written = (value: number | undefined) =>
    measure ? text(value, measure.kind, system) : String(value);
  if (detail.reason === "range") {
    return `${label} must lie between ${written(detail.min)} and ${written(detail.max)}. It is ${written(detail.value)}.`;
  }
  return `${label} does not fit the other sizes. ${detail.note ?? ""}`.trim();
}

/** Floor, cover and volume by the engine's own geometry, or a sentence saying which size does not fit. */
export function derivedSizes(
  survey: Pick<Survey, "shape" | "ridgeBearing" | "covers">,
  system: UnitSystem,
): Derived {
  const heights = heightsProblem(survey.shape);
  if (heights) return { sizes: null, problem: heights };
  const { kneewall } = survey.covers;
  try {
    const sizes = houseGeometry(houseShapeOf(survey.shape), {
      ridgeBearingDeg: quantitySi(survey.ridgeBearing),
      kneewallHeightM: kneewall ? quantitySi(kneewall.height) : 0,
    });
    return { sizes, problem: null };
  } catch (error) {
    if (!(error instanceof EngineInputError)) throw error;
    return { sizes: null, problem: engineProblem(error.detail, system) };
  }
}
