import { queryOptions } from "@tanstack/react-query";
import type { ListOf } from "../../server/contracts/common.ts";
import type { PersonView } from "../../server/contracts/people.ts";
import { api } from "./api-client.ts";

export function peopleQuery(cooperativeId: string) {
  return queryOptions({
    queryKey: ["cooperatives", cooperativeId, "people"],
    queryFn: async ({ signal }) =>
      (await api.get<ListOf<PersonView>>(`/api/cooperatives/${cooperativeId}/people`, { signal })).items,
  });
}
