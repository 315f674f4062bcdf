import { useMutation, useQueryClient } from "@tanstack/react-query";
import type { PlanView } from "../../../../server/contracts/plans.ts";
import { api } from "../../../lib/api-client.ts";
import { planQuery } from "../../../lib/plan-queries.ts";

/** A line in the talk about a plan. */
export function useWriteMessage(planId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (message: string) => api.post<PlanView>(`/api/plans/${planId}/messages`, { message }),
    onSuccess: (plan) => {
      client.setQueryData(planQuery(planId).queryKey, plan);
      void client.invalidateQueries({ queryKey: ["reviews"] });
    },
  });
}
