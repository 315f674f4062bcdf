import { requireInRange } from "../errors.ts";

/** Mean radius of the earth, km. Source [GEOID]. */
const EARTH_RADIUS_KM = 6371.0088;
const RAD = Math.PI / 180;

/**
 * Distance along the surface of a round earth.
 * Shape: four angles in degrees (latitudes −90 to 90, longitudes −180 to 180) → km. Throws EngineInputError outside. Source [GEOID].
 */
export function greatCircleKm(
  latitudeADeg: number,
  longitudeADeg: number,
  latitudeBDeg: number,
  longitudeBDeg: number,
): number {
  requireInRange("latitudeADeg", latitudeADeg, -90, 90, "°");
  requireInRange("latitudeBDeg", latitudeBDeg, -90, 90, "°");
  requireInRange("longitudeADeg", longitudeADeg, -180, 180, "°");
  requireInRange("longitudeBDeg", longitudeBDeg, -180, 180, "°");
  const halfLatitude = Math.sin(((latitudeBDeg - latitudeADeg) * RAD) / 2);
  const halfLongitude = Math.sin(((longitudeBDeg - longitudeADeg) * RAD) / 2);
  const chord =
    halfLatitude ** 2 + Math.cos(latitudeADeg * RAD) * Math.cos(latitudeBDeg * RAD) * halfLongitude ** 2;
  return 2 * EARTH_RADIUS_KM * Math.asin(Math.min(1, Math.sqrt(chord)));
}

/** What is needed of a station to rank it. */
export interface StationPlace {
  id: string;
  latitudeDeg: number;
  longitudeDeg: number;
  elevationM: number | null;
}

export interface RankedStation<S extends StationPlace> {
  station: S;
  distanceKm: number;
  /** Site minus station, m; null where the station's height is not known. */
  heightDifferenceM: number | null;
  /** Distance with the height difference counted in, km: what the ranking goes by. */
  rankKm: number;
}

/** A height difference of 100 m counts as much as this distance, km: 0.65 K against about 1 K per 150 km. Source [SPREADPRACTICE]. */
const KM_PER_100M = 25;

/**
 * The nearest stations, height difference counted in, best first; ties by id so that the order is always the same.
 * Shape: latitude and longitude in degrees, site height in m or null, stations, how many (1 to 100) → ranked list.
 * Throws EngineInputError outside the ranges. Source [SPREADPRACTICE].
 */
export function nearestStations<S extends StationPlace>(
  latitudeDeg: number,
  longitudeDeg: number,
  elevationM: number | null,
  stations: readonly S[],
  howMany = 5,
): RankedStation<S>[] {
  requireInRange("howMany", howMany, 1, 100);
  if (elevationM !== null) requireInRange("elevationM", elevationM, -430, 9000, "m");
  const ranked = stations.map((station) => {
    const distanceKm = greatCircleKm(latitudeDeg, longitudeDeg, station.latitudeDeg, station.longitudeDeg);
    const heightDifferenceM =
      elevationM === null || station.elevationM === null ? null : elevationM - station.elevationM;
    const rankKm = distanceKm + (Math.abs(heightDifferenceM ?? 0) / 100) * KM_PER_100M;
    return { station, distanceKm, heightDifferenceM, rankKm };
  });
  ranked.sort((a, b) => a.rankKm - b.rankKm || a.station.id.localeCompare(b.station.id, "en"));
  return ranked.slice(0, howMany);
}
