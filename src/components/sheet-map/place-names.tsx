import { keepPreviousData, useQuery } from "@tanstack/react-query";
import { Pane, useMap } from "react-leaflet";
import type { PlaceView } from "../../../server/contracts/climate.ts";
import { placesInViewQuery, viewBox } from "../../lib/places-in-view.ts";
import { useSettledView } from "./use-view.ts";

const CHARACTER_PX = 7.6;
const LINE_PX = 20;
const MOST_NAMES = 28;
/** On a map of the whole world every name is in the way of the boards. */
const LEAST_ZOOM = 2;

interface PlacedName {
  place: PlaceView;
  xPx: number;
  yPx: number;
}

/** Keeps the names that do not run into a larger town's name; the list comes largest first. */
function withoutOverlaps(names: PlacedName[]): PlacedName[] {
  const kept: PlacedName[] = [];
  for (const name of names) {
    if (kept.length === MOST_NAMES) break;
    const width = name.place.name.length * CHARACTER_PX + 18;
    const covered = kept.some(
      (other) =>
        Math.abs(other.yPx - name.yPx) < LINE_PX &&
        name.xPx < other.xPx + other.place.name.length * CHARACTER_PX + 18 &&
        other.xPx < name.xPx + width,
    );
    if (!covered) kept.push(name);
  }
  return kept;
}

function look(population: number): string {
  if (population >= 500_000) return "text-sm font-bold";
  return population >= 50_000 ? "text-sm font-semibold" : "text-xs";
}

/** Names of towns within the view, so that an outline without roads can be read. */
export function PlaceNames() {
  const map = useMap();
  useSettledView();
  const enabled = map.getZoom() >= LEAST_ZOOM;
  const { data: places = [] } = useQuery({
    ...placesInViewQuery(viewBox(map.getBounds(), map.getZoom())),
    placeholderData: keepPreviousData,
    enabled,
  });
  if (!enabled) return null;
  const names = withoutOverlaps(
    places.map((place) => {
      const { x, y } = map.latLngToLayerPoint([place.latitudeDeg, place.longitudeDeg]);
      return { place, xPx: x, yPx: y };
    }),
  );
  return (
    <Pane name="places" style={{ zIndex: 350, pointerEvents: "none" }}>
      {names.map(({ place, xPx, yPx }) => (
        <span
          key={`${place.name} ${place.latitudeDeg} ${place.longitudeDeg}`}
          className={`map-name absolute flex items-center gap-1.5 whitespace-nowrap text-ink-2 ${look(place.population)}`}
          style={{ left: xPx - 3, top: yPx - LINE_PX / 2 }}
        >
          <span className="size-1.5 flex-none rounded-full bg-ink-2" />
          {place.name}
        </span>
      ))}
    </Pane>
  );
}
