import { px } from "./frame.ts";
import { hatch } from "./hatches.tsx";
import type { HeatPath } from "./heat-paths.ts";

export interface Place {
  x: number;
  y: number;
}

/** Least width at which an arrow still reads as one. */
const LEAST_WIDTH_PX = 2.2;
/** A path carrying less than this is written in the table and not drawn. */
export const LEAST_DRAWN_W = 50;

/** Width of an arrow in drawing units: proportional to the heat it carries. */
export function arrowWidth(heatW: number, widthPerW: number): number {
  return Math.max(LEAST_WIDTH_PX, heatW * widthPerW);
}

/** Length of the head beyond the end of the shaft. */
export function headLength(width: number): number {
  return Math.max(12, width * 0.6);
}

interface HeatArrowProps {
  path: HeatPath;
  from: Place;
  /** Where the shaft ends; the head goes on from there. */
  to: Place;
  width: number;
}

/** A straight arrow whose shaft is as wide as the heat it carries. */
export function HeatArrow({ path, from, to, width }: HeatArrowProps) {
  const length = Math.hypot(to.x - from.x, to.y - from.y) || 1;
  const dx = (to.x - from.x) / length;
  const dy = (to.y - from.y) / length;
  const half = width / 2;
  const barb = half + Math.min(8, 4 + width * 0.4);
  const head = headLength(width);
  const point = (along: Place, side: number, forward = 0) =>
    `${px(along.x - dy * side + dx * forward)} ${px(along.y + dx * side + dy * forward)}`;
  const line = [
    point(from, half),
    point(to, half),
    point(to, barb),
    point(to, 0, head),
    point(to, -barb),
    point(to, -half),
    point(from, -half),
  ].join("L");
  return (
    <path
      d={`M${line}Z`}
      fill={hatch(path)}
      stroke="var(--color-ink)"
      strokeWidth="1.1"
      strokeLinejoin="round"
      className="heat-arrow"
    />
  );
}
