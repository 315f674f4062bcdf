import type { StationChoice } from "../../contracts/buildings.ts";
import { nearestStations, type RankedStation } from "../../engine/climate/nearest-station.ts";
import { ClimateStation } from "../../models/climate-station.ts";

/** Beyond these a person is told; beyond the last no plan is worked out on a station nobody chose. */
const FAR_KM = 100;
const HIGH_M = 200;
export const TOO_FAR_KM = 400;

type StationPlace = Pick<
  ClimateStation,
  "id" | "name" | "country" | "latitudeDeg" | "longitudeDeg" | "elevationM"
>;

/** Station places hardly ever change, and every building asks for them. */
let places: StationPlace[] | null = null;

async function stationPlaces(): Promise<StationPlace[]> {
  places ??= (
    await ClimateStation.findAll({
      attributes: ["id", "name", "country", "latitudeDeg", "longitudeDeg", "elevationM"],
    })
  ).map((row) => row.get({ plain: true }));
  return places;
}

/** Called when the stations were seeded again. */
export function forgetStationPlaces(): void {
  places = null;
}

function caution(distanceKm: number, heightM: number | null): string | null {
  const words: string[] = [];
  if (distanceKm > FAR_KM) words.push(`it is ${Math.round(distanceKm)} km away`);
  if (heightM !== null && Math.abs(heightM) > HIGH_M) {
    words.push(`the site lies ${Math.abs(Math.round(heightM))} m ${heightM > 0 ? "higher" : "lower"}`);
  }
  if (words.length === 0) return null;
  return `This station may not fit: ${words.join(", and ")}. Compare it with what people here remember.`;
}

function presentChoice({
  station,
  distanceKm,
  heightDifferenceM,
}: RankedStation<StationPlace>): StationChoice {
  return {
    id: station.id,
    name: station.name,
    country: station.country,
    distanceKm,
    elevationM: station.elevationM,
    heightDifferenceM,
    caution: caution(distanceKm, heightDifferenceM),
  };
}

export interface Site {
  latitudeDeg: number;
  longitudeDeg: number;
  elevationM: number | null;
}

/** The best stations for a site, height difference counted in. */
export async function stationsFor(site: Site, howMany: number): Promise<StationChoice[]> {
  const ranked = nearestStations(
    site.latitudeDeg,
    site.longitudeDeg,
    site.elevationM,
    await stationPlaces(),
    howMany,
  );
  return ranked.map(presentChoice);
}

/** The chosen station seen from a site, or the best one when none was chosen. */
export async function stationOf(site: Site, stationId: string | null): Promise<StationChoice> {
  const chosen = (await stationPlaces()).filter((station) => station.id === stationId);
  const candidates = chosen.length > 0 ? chosen : await stationPlaces();
  const [best] = nearestStations(site.latitudeDeg, site.longitudeDeg, site.elevationM, candidates, 1);
  if (best === undefined) throw new Error("there are no climate stations");
  return presentChoice(best);
}
