import { requireInRange } from "../errors.ts";
import type { HouseShape } from "./house-shape.ts";

/** A point of a cross-section, m: x across the house from its left foot, y up from the ground. */
export interface SectionPoint {
  x: number;
  y: number;
}

/** How many chords stand for one curved roof side. Areas are scaled to the exact arc, so this decides the drawing only. */
const CHORDS_PER_SIDE = 8;

/** Across-section of one span: walls and roof from the left foot over the crown to the right foot. */
export interface SpanSection {
  /** Left roof edge to right roof edge, in order. */
  roof: SectionPoint[];
  leftWallM: number;
  rightWallM: number;
}

/**
 * Roof line of one span of a house.
 *
 * Shapes: one span; multi-span houses repeat it. Units m.
 * Errors: EngineInputError when heights do not fit each other.
 * Source: plane geometry.
 */
export function spanSection(shape: HouseShape): SpanSection {
  switch (shape.type) {
    case "roundArch":
      return roundArch(shape.widthM, shape.riseM, shape.wallHeightM);
    case "gothicArch":
      return gothicArch(shape.widthM, shape.eaveHeightM, shape.ridgeHeightM, shape.roofBowM);
    case "gable":
    case "atticBarn":
      return gable(shape.widthM, shape.eaveHeightM, shape.ridgeHeightM);
    case "multiSpan":
      return gable(shape.spanWidthM, shape.gutterHeightM, shape.ridgeHeightM);
    case "venlo": {
      const rise = (shape.spanWidthM / 2) * Math.tan((shape.roofSlopeDeg * Math.PI) / 180);
      return gable(shape.spanWidthM, shape.gutterHeightM, shape.gutterHeightM + rise);
    }
    case "monoPitch":
      return monoPitch(shape.widthM, shape.lowEaveM, shape.highEaveM);
  }
}

function gable(widthM: number, eaveM: number, ridgeM: number): SpanSection {
  requireInRange("ridgeHeightM", ridgeM, eaveM + 0.01, 100, "m");
  const roof = [
    { x: 0, y: eaveM },
    { x: widthM / 2, y: ridgeM },
    { x: widthM, y: eaveM },
  ];
  return { roof, leftWallM: eaveM, rightWallM: eaveM };
}

function monoPitch(widthM: number, lowM: number, highM: number): SpanSection {
  requireInRange("highEaveM", highM, lowM, 100, "m");
  const roof = [
    { x: 0, y: lowM },
    { x: widthM, y: highM },
  ];
  return { roof, leftWallM: lowM, rightWallM: highM };
}

/** Half angle of the circle segment whose chord is `widthM` and whose height is `riseM`; above 90° the arch bulges past its feet. */
export function archHalfAngle(widthM: number, riseM: number): number {
  return 2 * Math.atan((2 * riseM) / widthM);
}

function roundArch(widthM: number, riseM: number, wallM: number): SpanSection {
  requireInRange("riseM", riseM, 0.05 * widthM, widthM, "m");
  const half = archHalfAngle(widthM, riseM);
  const radius = widthM / 2 / Math.sin(half);
  const centreY = wallM + riseM - radius;
  const steps = 2 * CHORDS_PER_SIDE;
  const roof = Array.from({ length: steps + 1 }, (_, index) => {
    const angle = -half + (2 * half * index) / steps;
    return { x: widthM / 2 + radius * Math.sin(angle), y: centreY + radius * Math.cos(angle) };
  });
  return { roof, leftWallM: wallM, rightWallM: wallM };
}

function gothicArch(widthM: number, eaveM: number, ridgeM: number, bowM: number): SpanSection {
  requireInRange("ridgeHeightM", ridgeM, eaveM + 0.01, 100, "m");
  const chord = Math.hypot(widthM / 2, ridgeM - eaveM);
  requireInRange("roofBowM", bowM, 0, chord / 3, "m");
  const nx = -(ridgeM - eaveM) / chord;
  const ny = widthM / 2 / chord;
  const left = Array.from({ length: CHORDS_PER_SIDE + 1 }, (_, index) => {
    const t = index / CHORDS_PER_SIDE;
    const bulge = 4 * bowM * t * (1 - t);
    return { x: (t * widthM) / 2 + nx * bulge, y: eaveM + t * (ridgeM - eaveM) + ny * bulge };
  });
  const right = left
    .slice(0, -1)
    .reverse()
    .map(({ x, y }) => ({ x: widthM - x, y }));
  return { roof: [...left, ...right], leftWallM: eaveM, rightWallM: eaveM };
}

/**
 * Outline of the whole cross-section for drawing: from the left foot over every roof to the right foot.
 *
 * Shapes: for multi-span ranges all spans in a row, at most `maxSpans`. Units m.
 */
export function sectionOutline(shape: HouseShape, maxSpans = Number.POSITIVE_INFINITY): SectionPoint[] {
  const span = spanSection(shape);
  const spans = Math.min(maxSpans, "spanCount" in shape ? shape.spanCount : 1);
  const width = "spanWidthM" in shape ? shape.spanWidthM : shape.widthM;
  const points: SectionPoint[] = [{ x: 0, y: 0 }];
  for (let index = 0; index < spans; index += 1) {
    // The gutter point between two spans belongs to both and is written once.
    const roof = index === 0 ? span.roof : span.roof.slice(1);
    points.push(...roof.map(({ x, y }) => ({ x: x + index * width, y })));
  }
  points.push({ x: spans * width, y: 0 });
  return points;
}
