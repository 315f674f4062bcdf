import type { FeatureCollection, Geometry, Position } from "geojson";

const isJump = (from: Position, to: Position) =>
  Math.abs((from[0] ?? 0) - (to[0] ?? 0)) > 180 && (from[1] ?? 0) > -89.9;

/** The ring with longitudes that run on past 180°, and how far it ran. */
function unrolled(ring: Position[]): { ring: Position[]; shifted: boolean } {
  let turn = 0;
  let shifted = false;
  const points = ring.map((point, index) => {
    const before = ring[index - 1];
    if (before !== undefined && isJump(before, point)) {
      turn += (before[0] ?? 0) > 0 ? 360 : -360;
      shifted = true;
    }
    return [(point[0] ?? 0) + turn, point[1] ?? 0];
  });
  return { ring: points, shifted };
}

const moved = (polygon: Position[][], byDeg: number) =>
  polygon.map((ring) => ring.map(([longitude = 0, latitude = 0]) => [longitude + byDeg, latitude]));

function polygonsOf(geometry: Geometry): Position[][][] {
  if (geometry.type === "Polygon") return [geometry.coordinates];
  return geometry.type === "MultiPolygon" ? geometry.coordinates : [];
}

/**
 * Land that lies on both sides of the date line, drawn once on each side.
 * As the atlas has it, such a ring jumps from 180° to −180°, and filling it paints a band round the world.
 */
export function drawnOnBothSides(land: FeatureCollection): FeatureCollection {
  const coordinates = land.features
    .flatMap((feature) => polygonsOf(feature.geometry))
    .flatMap((polygon) => {
      const rings = polygon.map(unrolled);
      const [outer] = rings;
      if (outer === undefined || !outer.shifted) return [polygon];
      const whole = rings.map(({ ring }) => ring);
      const east = Math.max(...outer.ring.map(([longitude = 0]) => longitude));
      return [whole, moved(whole, east > 180 ? -360 : 360)];
    });
  return {
    type: "FeatureCollection",
    features: [{ type: "Feature", properties: {}, geometry: { type: "MultiPolygon", coordinates } }],
  };
}
