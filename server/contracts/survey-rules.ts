import { fromSi, units } from "../engine/units.ts";
import { type Quantity, siValue } from "./quantity.ts";
import type { Survey, SurveyShape } from "./survey.ts";

/** Contract path of an answer and what is wrong with it. */
export type FieldProblems = Record<string, string>;

function inUnit(si: number, like: Quantity): string {
  const value = Number(fromSi(si, like.unit).toPrecision(4));
  return `${value} ${units[like.unit].symbol}`;
}

function typed(quantity: Quantity): string {
  return `${quantity.typed} ${units[quantity.unit].symbol}`;
}

function above(
  problems: FieldProblems,
  path: string,
  label: string,
  upper: Quantity,
  lowerLabel: string,
  lower: Quantity,
): void {
  if (siValue(upper) > siValue(lower)) return;
  problems[path] =
    `${label} must be higher than the ${lowerLabel} (${inUnit(siValue(lower), upper)}). You typed ${typed(upper)}.`;
}

function shapeProblems(shape: SurveyShape, problems: FieldProblems): void {
  switch (shape.type) {
    case "roundArch": {
      const width = siValue(shape.width);
      const rise = siValue(shape.rise);
      if (rise < 0.08 * width || rise > 0.95 * width) {
        const range = `${inUnit(0.08 * width, shape.rise)} and ${inUnit(0.95 * width, shape.rise)}`;
        problems["shape.rise"] =
          `Arch rise must lie between ${range} for this width. You typed ${typed(shape.rise)}.`;
      }
      return;
    }
    case "gothicArch": {
      above(problems, "shape.ridgeHeight", "Ridge", shape.ridgeHeight, "eave", shape.eaveHeight);
      const chord = Math.hypot(
        siValue(shape.width) / 2,
        siValue(shape.ridgeHeight) - siValue(shape.eaveHeight),
      );
      if (siValue(shape.roofBow) > chord / 3) {
        problems["shape.roofBow"] =
          `Roof bow must be at most ${inUnit(chord / 3, shape.roofBow)} for this roof. You typed ${typed(shape.roofBow)}.`;
      }
      return;
    }
    case "gable":
    case "atticBarn":
      above(problems, "shape.ridgeHeight", "Ridge", shape.ridgeHeight, "eave", shape.eaveHeight);
      return;
    case "multiSpan":
      above(problems, "shape.ridgeHeight", "Ridge", shape.ridgeHeight, "gutter", shape.gutterHeight);
      return;
    case "monoPitch":
      if (siValue(shape.highEave) < siValue(shape.lowEave)) {
        above(problems, "shape.highEave", "High eave", shape.highEave, "low eave", shape.lowEave);
      }
      return;
    case "venlo":
      return;
  }
}

function lowestWall(shape: SurveyShape): Quantity {
  switch (shape.type) {
    case "roundArch":
      return shape.wallHeight;
    case "monoPitch":
      return shape.lowEave;
    case "multiSpan":
    case "venlo":
      return shape.gutterHeight;
    default:
      return shape.eaveHeight;
  }
}

function partProblems(survey: Survey, problems: FieldProblems): void {
  const { kneewall, ceiling } = survey.covers;
  const wall = lowestWall(survey.shape);
  if (kneewall !== null && siValue(kneewall.height) > siValue(wall)) {
    problems["covers.kneewall.height"] =
      `Kneewall must not be higher than the wall (${inUnit(siValue(wall), kneewall.height)}). You typed ${typed(kneewall.height)}.`;
  }
  if (survey.shape.type === "atticBarn" && ceiling === null) {
    problems["covers.ceiling"] = "A barn with an attic needs a ceiling.";
  }
  if (survey.shape.type !== "atticBarn" && ceiling !== null) {
    problems["covers.ceiling"] = "Only a barn with an attic has a ceiling of its own.";
  }
}

function stockProblems(survey: Survey, problems: FieldProblems): void {
  if (survey.use.kind !== "barn") return;
  survey.months.forEach((month, index) => {
    if (siValue(month.headCount) > 0 && siValue(month.mass) <= 0) {
      problems[`months.${index}.mass`] = "Animals need a mass. Write what one of them weighs.";
    }
  });
}

/** What two or more answers say against each other. Read by the form and by the server; nothing is stored while any stands. */
export function surveyProblems(survey: Survey): FieldProblems {
  const problems: FieldProblems = {};
  shapeProblems(survey.shape, problems);
  partProblems(survey, problems);
  stockProblems(survey, problems);
  return problems;
}
