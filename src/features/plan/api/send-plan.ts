import { useMutation, useQueryClient } from "@tanstack/react-query";
import type { PlanView } from "../../../../server/contracts/plans.ts";
import { api } from "../../../lib/api-client.ts";
import { planQuery } from "../../../lib/plan-queries.ts";

/** Puts one option of a plan before the farmer. */
export function useSendPlan(planId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: { optionId: string; message: string }) =>
      api.post<PlanView>(`/api/plans/${planId}/send`, body),
    onSuccess: (plan) => {
      client.setQueryData(planQuery(planId).queryKey, plan);
      void client.invalidateQueries({ queryKey: ["reviews"] });
      return client.invalidateQueries({ queryKey: ["buildings"] });
    },
  });
}
