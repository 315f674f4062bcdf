import type { ShapeType } from "../../../server/contracts/buildings.ts";
import type { Quantity } from "../../../server/contracts/quantity.ts";
import type { SurveyShape } from "../../../server/contracts/survey.ts";
import { quantitySi } from "../../lib/quantity-value.ts";
import type { OutlinePoint } from "../outline-points.ts";

/** One measure that can be shown as a dimension line. */
export interface SectionDimension {
  /** The survey answer it belongs to, or null for a size that follows from others. */
  path: string | null;
  name: string;
  valueM: number;
  place: "bottom" | "left" | "right";
  /** Ends along the line: heights for upright lines, distances from the middle for level ones. */
  fromM: number;
  toM: number;
}

/** What the drawings need of a house: its outer line in metres, middle at 0, ground at 0. */
export interface SectionShape {
  type: ShapeType;
  widthM: number;
  drawnWidthM: number;
  lengthM: number;
  sideM: number;
  topM: number;
  spans: number;
  drawnSpans: number;
  spanWidthM: number;
  outline: OutlinePoint[];
  dimensions: SectionDimension[];
}

const MOST_SPANS_DRAWN = 3;
const CURVE_STEPS = 14;
const DEG = Math.PI / 180;

/** Half a parabola between two points, bulging `bowM` past the straight line between them. */
function bowed(from: OutlinePoint, to: OutlinePoint, bowM: number): OutlinePoint[] {
  const dx = to.x - from.x;
  const dy = to.y - from.y;
  const length = Math.hypot(dx, dy) || 1;
  return Array.from({ length: CURVE_STEPS + 1 }, (_, i) => {
    const t = i / CURVE_STEPS;
    const out = 4 * t * (1 - t) * bowM;
    return { x: from.x + dx * t - (dy / length) * out, y: from.y + dy * t + (dx / length) * out };
  });
}

/** Circle through both springing points and the crown. */
function arch(halfM: number, springM: number, riseM: number): OutlinePoint[] {
  const radiusM = (riseM * riseM + halfM * halfM) / (2 * riseM);
  const centreM = springM + riseM - radiusM;
  const start = Math.asin((springM - centreM) / radiusM);
  const from = Math.PI - start;
  const to = start;
  const steps = CURVE_STEPS * 3;
  return Array.from({ length: steps + 1 }, (_, i) => {
    const angle = from + ((to - from) * i) / steps;
    return { x: radiusM * Math.cos(angle), y: centreM + radiusM * Math.sin(angle) };
  });
}

function spansOutline(spanM: number, drawn: number, gutterM: number, ridgeM: number): OutlinePoint[] {
  const left = (-spanM * drawn) / 2;
  const points: OutlinePoint[] = [
    { x: left, y: 0 },
    { x: left, y: gutterM },
  ];
  for (let i = 0; i < drawn; i++) {
    points.push({ x: left + spanM * (i + 0.5), y: ridgeM }, { x: left + spanM * (i + 1), y: gutterM });
  }
  points.push({ x: -left, y: 0 });
  return points;
}

const si = (quantity: Quantity): number => quantitySi(quantity);

function single(
  shape: Exclude<SurveyShape, { type: "multiSpan" | "venlo" }>,
): Pick<SectionShape, "sideM" | "topM" | "outline" | "dimensions"> {
  const widthM = si(shape.width);
  const half = widthM / 2;
  const bottom: SectionDimension = {
    path: "shape.width",
    name: "Width",
    valueM: widthM,
    place: "bottom",
    fromM: -half,
    toM: half,
  };
  const left = (path: string, name: string, toM: number): SectionDimension => ({
    path,
    name,
    valueM: toM,
    place: "left",
    fromM: 0,
    toM,
  });
  const right = (path: string, name: string, fromM: number, toM: number): SectionDimension => ({
    path,
    name,
    valueM: toM - fromM,
    place: "right",
    fromM,
    toM,
  });
  if (shape.type === "roundArch") {
    const sideM = si(shape.wallHeight);
    const topM = sideM + si(shape.rise);
    const wall = sideM > 0 ? [{ x: -half, y: 0 }] : [];
    const mirrored = sideM > 0 ? [{ x: half, y: 0 }] : [];
    return {
      sideM,
      topM,
      outline: [...wall, ...arch(half, sideM, si(shape.rise)), ...mirrored],
      dimensions: [
        bottom,
        ...(sideM > 0 ? [left("shape.wallHeight", "Wall", sideM)] : []),
        right("shape.rise", "Rise", sideM, topM),
      ],
    };
  }
  if (shape.type === "monoPitch") {
    const low = si(shape.lowEave);
    const high = si(shape.highEave);
    return {
      sideM: low,
      topM: Math.max(low, high),
      outline: [
        { x: -half, y: 0 },
        { x: -half, y: low },
        { x: half, y: high },
        { x: half, y: 0 },
      ],
      dimensions: [
        bottom,
        left("shape.lowEave", "Low side", low),
        right("shape.highEave", "High side", 0, high),
      ],
    };
  }
  const eave = si(shape.eaveHeight);
  const ridge = si(shape.ridgeHeight);
  const dimensions = [
    bottom,
    left("shape.eaveHeight", "Eave", eave),
    right("shape.ridgeHeight", "Ridge", 0, ridge),
  ];
  const top = { x: 0, y: ridge };
  if (shape.type === "gothicArch") {
    const roof = bowed({ x: -half, y: eave }, top, si(shape.roofBow));
    const mirrored = roof
      .slice(0, -1)
      .reverse()
      .map((p) => ({ x: -p.x, y: p.y }));
    return {
      sideM: eave,
      topM: ridge,
      outline: [{ x: -half, y: 0 }, ...roof, ...mirrored, { x: half, y: 0 }],
      dimensions,
    };
  }
  return {
    sideM: eave,
    topM: ridge,
    outline: [{ x: -half, y: 0 }, { x: -half, y: eave }, top, { x: half, y: eave }, { x: half, y: 0 }],
    dimensions,
  };
}

function several(shape: Extract<SurveyShape, { type: "multiSpan" | "venlo" }>): SectionShape {
  const spanM = si(shape.spanWidth);
  const spans = si(shape.spanCount);
  const gutterM = si(shape.gutterHeight);
  const ridgeM =
    shape.type === "venlo"
      ? gutterM + (spanM / 2) * Math.tan(si(shape.roofSlope) * DEG)
      : si(shape.ridgeHeight);
  const drawn = Math.max(1, Math.min(MOST_SPANS_DRAWN, Math.round(spans)));
  const left = (-spanM * drawn) / 2;
  return {
    type: shape.type,
    widthM: spanM * spans,
    drawnWidthM: spanM * drawn,
    lengthM: si(shape.length),
    sideM: gutterM,
    topM: ridgeM,
    spans,
    drawnSpans: drawn,
    spanWidthM: spanM,
    outline: spansOutline(spanM, drawn, gutterM, ridgeM),
    dimensions: [
      {
        path: "shape.spanWidth",
        name: "Span",
        valueM: spanM,
        place: "bottom",
        fromM: left,
        toM: left + spanM,
      },
      { path: "shape.gutterHeight", name: "Gutter", valueM: gutterM, place: "left", fromM: 0, toM: gutterM },
      {
        path: shape.type === "multiSpan" ? "shape.ridgeHeight" : null,
        name: "Ridge",
        valueM: ridgeM,
        place: "right",
        fromM: 0,
        toM: ridgeM,
      },
    ],
  };
}

/**
 * The section of a surveyed shape, or null while the typed numbers do not make a house:
 * something missing, not above zero, or a ridge that is not above its eave.
 */
export function sectionShape(shape: SurveyShape): SectionShape | null {
  const made =
    shape.type === "multiSpan" || shape.type === "venlo" ? several(shape) : withSpan(shape, single(shape));
  const sizes = [made.widthM, made.drawnWidthM, made.lengthM, made.topM];
  if (!sizes.every((size) => Number.isFinite(size) && size > 0)) return null;
  if (!(Number.isFinite(made.sideM) && made.sideM >= 0 && made.sideM < made.topM)) {
    if (made.type !== "monoPitch" || made.sideM !== made.topM) return null;
  }
  return made.outline.every((p) => Number.isFinite(p.x) && Number.isFinite(p.y)) ? made : null;
}

function withSpan(
  shape: Exclude<SurveyShape, { type: "multiSpan" | "venlo" }>,
  drawn: ReturnType<typeof single>,
): SectionShape {
  const widthM = si(shape.width);
  return {
    ...drawn,
    type: shape.type,
    widthM,
    drawnWidthM: widthM,
    lengthM: si(shape.length),
    spans: 1,
    drawnSpans: 1,
    spanWidthM: widthM,
  };
}
