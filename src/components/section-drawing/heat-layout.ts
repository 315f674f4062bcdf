import type { FrameFit } from "./frame.ts";

/** Fixed places for arrows and words, so that the eye finds them again on every house. */
export interface HeatLayout extends FrameFit {
  fontSize: number;
  /** Width of the arrow that carries the most heat of the year. */
  widestArrow: number;
  skyLength: number;
  coverLength: number;
  airLength: number;
  /** Left edge of the column of labels at the right. */
  labelX: number;
  /** Room of one label under the ground, the last left edge it may have, and its depth below the ground line. */
  slotWidth: number;
  slotEnd: number;
  slotDrop: number;
  /** Names stand beside the numbers; on the phone they stand in the table below. */
  named: boolean;
}

export const heatLayouts: Record<"wide" | "phone", HeatLayout> = {
  wide: {
    width: 968,
    height: 500,
    widthShare: 0.44,
    heightShare: 0.42,
    centreShare: 0.46,
    groundShare: 0.73,
    fontSize: 14,
    widestArrow: 54,
    skyLength: 80,
    coverLength: 84,
    airLength: 58,
    labelX: 800,
    slotWidth: 162,
    slotEnd: 690,
    slotDrop: 52,
    named: true,
  },
  phone: {
    width: 390,
    height: 330,
    widthShare: 0.54,
    heightShare: 0.4,
    centreShare: 0.42,
    groundShare: 0.71,
    fontSize: 13,
    widestArrow: 34,
    skyLength: 40,
    coverLength: 40,
    airLength: 26,
    labelX: 312,
    slotWidth: 78,
    slotEnd: 256,
    slotDrop: 38,
    named: false,
  },
};

/** Moves labels of a column apart so that none covers another, keeping their order from top to bottom. */
export function spread(wanted: number[], gap: number, top: number, bottom: number): number[] {
  const order = wanted.map((y, i) => ({ y, i })).sort((a, b) => a.y - b.y);
  let last = top - gap;
  for (const entry of order) {
    entry.y = Math.max(entry.y, last + gap);
    last = entry.y;
  }
  let next = bottom + gap;
  for (const entry of [...order].reverse()) {
    entry.y = Math.min(entry.y, next - gap);
    next = entry.y;
  }
  const placed = [...wanted];
  for (const entry of order) placed[entry.i] = entry.y;
  return placed;
}
