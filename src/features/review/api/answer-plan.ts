import { useMutation, useQueryClient } from "@tanstack/react-query";
import type { PlanAnswer, PlanView } from "../../../../server/contracts/plans.ts";
import { api } from "../../../lib/api-client.ts";
import { planQuery } from "../../../lib/plan-queries.ts";

/** The farmer's answer to a plan. */
export function useAnswerPlan(planId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: { answer: PlanAnswer; message: string }) =>
      api.post<PlanView>(`/api/plans/${planId}/answer`, body),
    onSuccess: (plan) => {
      client.setQueryData(planQuery(planId).queryKey, plan);
      void client.invalidateQueries({ queryKey: ["reviews"] });
      void client.invalidateQueries({ queryKey: ["buildings"] });
      void client.invalidateQueries({ queryKey: ["me"] });
    },
  });
}
