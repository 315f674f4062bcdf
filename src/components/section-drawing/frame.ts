import type { OutlinePoint } from "../outline-points.ts";
import type { SectionShape } from "./section-shape.ts";

/** Metres to drawing units: one scale for both directions, the house on the ground line. */
export interface Frame {
  width: number;
  height: number;
  groundY: number;
  scale: number;
  x: (metres: number) => number;
  y: (metres: number) => number;
}

export interface FrameFit {
  width: number;
  height: number;
  /** Share of the drawing's width and height the house may take. */
  widthShare: number;
  heightShare: number;
  /** Where the middle of the house and the ground stand, as shares of width and height. */
  centreShare: number;
  groundShare: number;
}

export function frameFor(shape: SectionShape, fit: FrameFit): Frame {
  const scale = Math.min(
    (fit.width * fit.widthShare) / shape.drawnWidthM,
    (fit.height * fit.heightShare) / shape.topM,
  );
  const groundY = Math.round(fit.height * fit.groundShare);
  const centreX = fit.width * fit.centreShare;
  return {
    width: fit.width,
    height: fit.height,
    groundY,
    scale,
    x: (metres) => centreX + metres * scale,
    y: (metres) => groundY - metres * scale,
  };
}

export function px(value: number): string {
  return value.toFixed(1);
}

export function polyline(points: OutlinePoint[], frame: Frame): string {
  return `M${points.map((p) => `${px(frame.x(p.x))} ${px(frame.y(p.y))}`).join("L")}`;
}

/** A point of the roof line above `x` metres from the middle, and the direction away from the house there. */
export function roofAt(points: OutlinePoint[], x: number): { point: OutlinePoint; out: OutlinePoint } {
  for (let i = 1; i < points.length; i++) {
    const a = points[i - 1];
    const b = points[i];
    if (!a || !b || a.x === b.x) continue;
    const low = Math.min(a.x, b.x);
    const high = Math.max(a.x, b.x);
    if (x < low || x > high || b.y === 0 || a.y === 0) continue;
    const t = (x - a.x) / (b.x - a.x);
    const length = Math.hypot(b.x - a.x, b.y - a.y);
    return {
      point: { x, y: a.y + (b.y - a.y) * t },
      out: { x: -(b.y - a.y) / length, y: (b.x - a.x) / length },
    };
  }
  return { point: { x, y: Math.max(...points.map((p) => p.y)) }, out: { x: 0, y: 1 } };
}

/** The outline moved inwards by a distance in metres, parallel to itself; the feet stay on the ground. */
export function innerLine(points: OutlinePoint[], insetM: number): OutlinePoint[] {
  const last = points.length - 1;
  const inward = (from: OutlinePoint, to: OutlinePoint): OutlinePoint => {
    const length = Math.hypot(to.x - from.x, to.y - from.y) || 1;
    return { x: (to.y - from.y) / length, y: -(to.x - from.x) / length };
  };
  return points.map((p, i) => {
    if (i === 0) return { x: p.x + insetM, y: 0 };
    if (i === last) return { x: p.x - insetM, y: 0 };
    const before = inward(points[i - 1] ?? p, p);
    const after = inward(p, points[i + 1] ?? p);
    const spread = 1 + before.x * after.x + before.y * after.y;
    const reach = insetM / Math.max(0.4, spread);
    return { x: p.x + (before.x + after.x) * reach, y: p.y + (before.y + after.y) * reach };
  });
}
