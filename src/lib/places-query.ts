import { queryOptions } from "@tanstack/react-query";
import type { PlaceView } from "../../server/contracts/climate.ts";
import type { ListOf } from "../../server/contracts/common.ts";
import { api } from "./api-client.ts";

/** Towns whose name begins with the text. */
export function placeSearchQuery(text: string) {
  return queryOptions({
    queryKey: ["places", "search", text],
    queryFn: async ({ signal }) => {
      const query = new URLSearchParams({ text });
      return (await api.get<ListOf<PlaceView>>(`/api/places/search?${query}`, { signal })).items;
    },
    enabled: text.trim().length >= 2,
    staleTime: Number.POSITIVE_INFINITY,
  });
}
