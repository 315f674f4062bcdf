import { requireInRange } from "../errors.ts";

/** A place, degrees north and east. */
export interface GeoPoint {
  latitudeDeg: number;
  longitudeDeg: number;
}

/** Mean radius of the earth, m. Source: IUGG mean radius, from memory. */
const EARTH_RADIUS_M = 6_371_008.8;

const radians = (degreesValue: number) => (degreesValue * Math.PI) / 180;

function offset(centre: GeoPoint, eastM: number, northM: number): GeoPoint {
  const latitudeDeg = centre.latitudeDeg + (northM / EARTH_RADIUS_M) * (180 / Math.PI);
  const circle = EARTH_RADIUS_M * Math.cos(radians(centre.latitudeDeg));
  return { latitudeDeg, longitudeDeg: centre.longitudeDeg + (eastM / circle) * (180 / Math.PI) };
}

/**
 * Corners of a rectangle on the ground around its middle, front left first, clockwise.
 *
 * Units: degrees, m; the length runs along the bearing. Local plane, good to 0.1 % for houses up to 1 km away from the poles.
 * Valid: latitude −89 to 89°, length and width 0.1 to 5000 m.
 * Errors: EngineInputError. Source: plane geometry.
 */
export function footprintCorners(
  centre: GeoPoint,
  lengthM: number,
  widthM: number,
  bearingDeg: number,
): GeoPoint[] {
  requireInRange("latitudeDeg", centre.latitudeDeg, -89, 89, "°");
  requireInRange("lengthM", lengthM, 0.1, 5000, "m");
  requireInRange("widthM", widthM, 0.1, 5000, "m");
  const along = radians(requireInRange("bearingDeg", bearingDeg, -360, 360, "°"));
  const corners = [
    [1, -1],
    [1, 1],
    [-1, 1],
    [-1, -1],
  ] as const;
  return corners.map(([forward, right]) => {
    const ahead = (forward * lengthM) / 2;
    const aside = (right * widthM) / 2;
    const eastM = ahead * Math.sin(along) + aside * Math.cos(along);
    const northM = ahead * Math.cos(along) - aside * Math.sin(along);
    return offset(centre, eastM, northM);
  });
}
