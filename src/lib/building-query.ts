import { queryOptions } from "@tanstack/react-query";
import type { BuildingView } from "../../server/contracts/buildings.ts";
import { api } from "./api-client.ts";

/** One building with what the reader may do to it. */
export function buildingQuery(buildingId: string) {
  return queryOptions({
    queryKey: ["buildings", buildingId],
    queryFn: ({ signal }) => api.get<BuildingView>(`/api/buildings/${buildingId}`, { signal }),
  });
}
