import { keepPreviousData, queryOptions } from "@tanstack/react-query";
import type { StationChoice } from "../../server/contracts/buildings.ts";
import type { StationView } from "../../server/contracts/climate.ts";
import type { ListOf, Position } from "../../server/contracts/common.ts";
import { api } from "./api-client.ts";

/** Stations near a place, best first. A hundred metres more or less ask for nothing new. */
export function nearestStationsQuery(position: Position | null) {
  const latitude = position?.latitudeDeg.toFixed(3) ?? "";
  const longitude = position?.longitudeDeg.toFixed(3) ?? "";
  return queryOptions({
    queryKey: ["stations", "near", latitude, longitude],
    queryFn: async ({ signal }) => {
      const query = new URLSearchParams({ latitude, longitude });
      return (await api.get<ListOf<StationChoice>>(`/api/climate/stations?${query}`, { signal })).items;
    },
    enabled: position !== null,
    placeholderData: keepPreviousData,
    staleTime: Number.POSITIVE_INFINITY,
  });
}

export function stationQuery(stationId: string | undefined) {
  return queryOptions({
    queryKey: ["stations", stationId],
    queryFn: ({ signal }) => api.get<StationView>(`/api/climate/stations/${stationId}`, { signal }),
    enabled: stationId !== undefined,
    staleTime: Number.POSITIVE_INFINITY,
  });
}
