import { queryOptions } from "@tanstack/react-query";
import type { LatLngBounds } from "leaflet";
import type { PlaceView } from "../../server/contracts/climate.ts";
import type { ListOf } from "../../server/contracts/common.ts";
import { api } from "./api-client.ts";

export interface ViewBox {
  south: number;
  west: number;
  north: number;
  east: number;
  zoom: number;
}

/** The view rounded outwards, so that a small move asks for nothing new. */
export function viewBox(bounds: LatLngBounds, zoom: number): ViewBox {
  const step = 90 / 2 ** Math.round(zoom);
  const down = (value: number) => Number((Math.floor(value / step) * step).toFixed(6));
  const up = (value: number) => Number((Math.ceil(value / step) * step).toFixed(6));
  return {
    south: Math.max(-90, down(bounds.getSouth())),
    west: Math.max(-180, down(bounds.getWest())),
    north: Math.min(90, up(bounds.getNorth())),
    east: Math.min(180, up(bounds.getEast())),
    zoom: Math.round(zoom),
  };
}

async function places(path: string, query: Record<string, string>, signal: AbortSignal) {
  const { items } = await api.get<ListOf<PlaceView>>(`${path}?${new URLSearchParams(query)}`, { signal });
  return items;
}

export function placesInViewQuery(box: ViewBox) {
  const query = Object.fromEntries(Object.entries(box).map(([key, value]) => [key, String(value)]));
  return queryOptions({
    queryKey: ["places", "in view", box],
    queryFn: ({ signal }) => places("/api/places", query, signal),
    staleTime: Number.POSITIVE_INFINITY,
    gcTime: 60_000,
  });
}
