import { queryOptions } from "@tanstack/react-query";
import type { PlanSummary } from "../../server/contracts/buildings.ts";
import type { ListOf } from "../../server/contracts/common.ts";
import type { PlanView } from "../../server/contracts/plans.ts";
import { api } from "./api-client.ts";

/** One plan with its frozen survey and result. */
export function planQuery(planId: string) {
  return queryOptions({
    queryKey: ["plans", planId],
    queryFn: ({ signal }) => api.get<PlanView>(`/api/plans/${planId}`, { signal }),
  });
}

/** The plans of a building, newest first. */
export function buildingPlansQuery(buildingId: string) {
  return queryOptions({
    queryKey: ["buildings", buildingId, "plans"],
    queryFn: async ({ signal }) => {
      const { items } = await api.get<ListOf<PlanSummary>>(`/api/buildings/${buildingId}/plans`, { signal });
      return [...items].sort((a, b) => b.number - a.number);
    },
  });
}
