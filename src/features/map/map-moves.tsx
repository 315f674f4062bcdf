import L from "leaflet";
import { useEffect, useRef } from "react";
import { useMap, useMapEvents } from "react-leaflet";
import type { BuildingSummary } from "../../../server/contracts/buildings.ts";

export function boundsOf(buildings: BuildingSummary[]): L.LatLngBounds | null {
  if (buildings.length === 0) return null;
  return L.latLngBounds(buildings.map((building) => [building.latitudeDeg, building.longitudeDeg]));
}

/** One yard alone should not fill the sheet. */
export const FIT = { padding: [80, 80] as [number, number], maxZoom: 13 };

interface MapMovesProps {
  buildings: BuildingSummary[];
  chosenId: string | null;
  /** True when the address did not say where to look. */
  fitFirst: boolean;
  onSettled(place: string): void;
}

/** Shows all buildings at first, brings a chosen one into view, and tells the address where the map stands. */
export function MapMoves({ buildings, chosenId, fitFirst, onSettled }: MapMovesProps) {
  const map = useMap();
  const fitted = useRef(!fitFirst);
  useMapEvents({
    moveend: () => {
      const { lat, lng } = map.getCenter();
      if (fitted.current) onSettled(`${lat.toFixed(4)},${lng.toFixed(4)},${map.getZoom()}`);
    },
  });
  useEffect(() => {
    const bounds = boundsOf(buildings);
    if (fitted.current || bounds === null) return;
    map.fitBounds(bounds, FIT);
    fitted.current = true;
  }, [buildings, map]);
  useEffect(() => {
    const chosen = buildings.find((building) => building.id === chosenId);
    if (chosen === undefined) return;
    const point = L.latLng(chosen.latitudeDeg, chosen.longitudeDeg);
    if (!map.getBounds().pad(-0.08).contains(point)) map.panTo(point, { animate: false });
  }, [buildings, chosenId, map]);
  return null;
}
