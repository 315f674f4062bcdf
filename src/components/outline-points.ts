export interface OutlinePoint {
  x: number;
  y: number;
}

export interface OutlineBox {
  widthM: number;
  heightM: number;
  middleM: number;
}

/** The smallest box round an outline that stands on the ground at height 0. */
export function outlineBox(points: OutlinePoint[]): OutlineBox {
  const xs = points.map((p) => p.x);
  const low = Math.min(...xs);
  const high = Math.max(...xs);
  return {
    widthM: high - low,
    heightM: Math.max(...points.map((p) => p.y)),
    middleM: (low + high) / 2,
  };
}

/** Indices at which the outline turns from falling to rising: the gutters between spans. */
function gutterIndices(points: OutlinePoint[]): number[] {
  const found: number[] = [];
  for (let i = 1; i < points.length - 1; i++) {
    const before = points[i - 1];
    const here = points[i];
    const after = points[i + 1];
    if (before && here && after && here.y > 0 && before.y > here.y && after.y > here.y) found.push(i);
  }
  return found;
}

/**
 * Keeps the first `most` spans of an outline with several, so that sixty spans stay readable.
 * `cut` says whether something was left out; the outline then ends at the last kept gutter's height.
 */
export function cutAfterSpans(
  points: OutlinePoint[],
  most: number,
): { points: OutlinePoint[]; cut: boolean; gutterXs: number[]; spans: number } {
  const gutters = gutterIndices(points);
  const xs = gutters.map((i) => points[i]?.x ?? 0);
  const spans = gutters.length + 1;
  const lastKept = gutters[most - 1];
  if (lastKept === undefined) return { points, cut: false, gutterXs: xs, spans };
  return { points: points.slice(0, lastKept + 1), cut: true, gutterXs: xs.slice(0, most - 1), spans };
}
