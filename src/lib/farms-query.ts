import { queryOptions } from "@tanstack/react-query";
import type { BuildingSummary } from "../../server/contracts/buildings.ts";
import type { ListOf } from "../../server/contracts/common.ts";
import type { FarmView } from "../../server/contracts/farms.ts";
import { api } from "./api-client.ts";

export const farmsQuery = queryOptions({
  queryKey: ["farms"],
  queryFn: async ({ signal }) => (await api.get<ListOf<FarmView>>("/api/farms", { signal })).items,
});

export function farmQuery(farmId: string) {
  return queryOptions({
    queryKey: ["farms", farmId],
    queryFn: ({ signal }) => api.get<FarmView>(`/api/farms/${farmId}`, { signal }),
  });
}

export const buildingsQuery = queryOptions({
  queryKey: ["buildings"],
  queryFn: async ({ signal }) => (await api.get<ListOf<BuildingSummary>>("/api/buildings", { signal })).items,
});
