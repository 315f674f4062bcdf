import { useMutation, useQueryClient } from "@tanstack/react-query";
import type { PlanView } from "../../../../server/contracts/plans.ts";
import { api } from "../../../lib/api-client.ts";
import { planQuery } from "../../../lib/plan-queries.ts";

/** Works the saved survey out into a new plan. */
export function useWorkOut(buildingId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () => api.post<PlanView>(`/api/buildings/${buildingId}/plans`, {}),
    onSuccess: (plan) => {
      client.setQueryData(planQuery(plan.id).queryKey, plan);
      return client.invalidateQueries({ queryKey: ["buildings"] });
    },
  });
}
