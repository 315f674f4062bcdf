/** Mean radius of the earth, m. Source: International Union of Geodesy and Geophysics, mean radius R1, from memory. */
const EARTH_RADIUS_M = 6_371_008.8;
const METRES_PER_DEGREE = (Math.PI / 180) * EARTH_RADIUS_M;

export interface GroundPoint {
  latitudeDeg: number;
  longitudeDeg: number;
}

export interface Footprint {
  lengthM: number;
  widthM: number;
  /** Direction of the ridge, degrees clockwise from north. */
  bearingDeg: number;
}

/** The pair Leaflet asks for. */
export function latLng({ latitudeDeg, longitudeDeg }: GroundPoint): [latitude: number, longitude: number] {
  return [latitudeDeg, longitudeDeg];
}

const radians = (deg: number) => (deg * Math.PI) / 180;

/** A longitude between -180° and 180°. */
export function wrapLongitude(longitudeDeg: number): number {
  const wrapped = ((((longitudeDeg + 180) % 360) + 360) % 360) - 180;
  return Number(wrapped.toFixed(7));
}

/** The point `eastM` and `northM` from another; exact enough for one yard. */
export function offset(from: GroundPoint, eastM: number, northM: number): GroundPoint {
  return {
    latitudeDeg: from.latitudeDeg + northM / METRES_PER_DEGREE,
    longitudeDeg: from.longitudeDeg + eastM / (METRES_PER_DEGREE * Math.cos(radians(from.latitudeDeg))),
  };
}

/** How far `to` lies east and north of `from`, m. */
export function eastNorthM(from: GroundPoint, to: GroundPoint): { eastM: number; northM: number } {
  return {
    eastM:
      wrapLongitude(to.longitudeDeg - from.longitudeDeg) *
      METRES_PER_DEGREE *
      Math.cos(radians(from.latitudeDeg)),
    northM: (to.latitudeDeg - from.latitudeDeg) * METRES_PER_DEGREE,
  };
}

/** A point in the house's own directions: along the ridge and to the right of it. */
export function fromMiddle(
  middle: GroundPoint,
  bearingDeg: number,
  alongM: number,
  acrossM: number,
): GroundPoint {
  const sin = Math.sin(radians(bearingDeg));
  const cos = Math.cos(radians(bearingDeg));
  return offset(middle, alongM * sin + acrossM * cos, alongM * cos - acrossM * sin);
}

/** The four corners of the ground plan, clockwise from the front right. */
export function corners(middle: GroundPoint, { lengthM, widthM, bearingDeg }: Footprint): GroundPoint[] {
  const half = { along: lengthM / 2, across: widthM / 2 };
  return [
    [half.along, half.across],
    [-half.along, half.across],
    [-half.along, -half.across],
    [half.along, -half.across],
  ].map(([along = 0, across = 0]) => fromMiddle(middle, bearingDeg, along, across));
}

/** A ridge has no front: bearings half a turn apart are the same, so 0 to 180 is enough. */
export function ridgeBearing(deg: number): number {
  return Math.round(((deg % 180) + 180) % 180);
}

/** What dragging an end of the ridge to `end` makes of the house: it turns and grows about its middle. */
export function afterRidgeDrag(
  middle: GroundPoint,
  end: GroundPoint,
): { lengthM: number; bearingDeg: number } {
  const { eastM, northM } = eastNorthM(middle, end);
  return {
    lengthM: 2 * Math.hypot(eastM, northM),
    bearingDeg: ridgeBearing((Math.atan2(eastM, northM) * 180) / Math.PI),
  };
}

/** What dragging the middle of a long side to `side` makes of the width. */
export function afterSideDrag(middle: GroundPoint, bearingDeg: number, side: GroundPoint): number {
  const { eastM, northM } = eastNorthM(middle, side);
  return 2 * Math.abs(eastM * Math.cos(radians(bearingDeg)) - northM * Math.sin(radians(bearingDeg)));
}
