import { useMutation, useQueryClient } from "@tanstack/react-query";
import type { FarmView } from "../../../server/contracts/farms.ts";
import { api } from "../../lib/api-client.ts";

export type FarmChange = Partial<Pick<FarmView, "name" | "place" | "sharedWithManager">>;

export function useChangeFarm(farmId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (change: FarmChange) => api.patch<FarmView>(`/api/farms/${farmId}`, change),
    onSuccess: (farm) => {
      client.setQueryData(["farms", farmId], farm);
      return client.invalidateQueries({ queryKey: ["farms"], exact: true });
    },
  });
}

export function useAssignAdvisor(farmId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (personId: string) => api.post<FarmView>(`/api/farms/${farmId}/advisors`, { personId }),
    onSuccess: () => client.invalidateQueries({ queryKey: ["farms"] }),
  });
}

export function useReleaseAdvisor(farmId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (personId: string) => api.delete<void>(`/api/farms/${farmId}/advisors/${personId}`),
    onSuccess: () => client.invalidateQueries({ queryKey: ["farms"] }),
  });
}
