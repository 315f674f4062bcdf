import { queryOptions } from "@tanstack/react-query";
import type { SitesView } from "../../server/contracts/sites.ts";
import { api } from "./api-client.ts";

export function sitesQuery(cooperativeId: string) {
  return queryOptions({
    queryKey: ["cooperatives", cooperativeId, "sites"],
    queryFn: ({ signal }) => api.get<SitesView>(`/api/cooperatives/${cooperativeId}/sites`, { signal }),
  });
}
