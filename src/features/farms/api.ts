import { useMutation, useQueryClient } from "@tanstack/react-query";
import type { BuildingView } from "../../../server/contracts/buildings.ts";
import type { FarmView } from "../../../server/contracts/farms.ts";
import { api } from "../../lib/api-client.ts";

export type FarmChange = Partial<Pick<FarmView, "name" | "place" | "sharedWithManager">> & {
  position?: { latitudeDeg: number; longitudeDeg: number };
};

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

export interface BuildingChange {
  name?: string;
  position?: { latitudeDeg: number; longitudeDeg: number };
  farFromFarmConfirmed?: boolean;
}

/** Everything that shows buildings is out of date once one was changed or removed. */
function useBuildingsChanged() {
  const client = useQueryClient();
  return () =>
    Promise.all(
      [["buildings"], ["farms"], ["cooperatives"]].map((queryKey) => client.invalidateQueries({ queryKey })),
    );
}

export function useChangeBuilding(buildingId: string) {
  const changed = useBuildingsChanged();
  return useMutation({
    mutationFn: (change: BuildingChange) => api.patch<BuildingView>(`/api/buildings/${buildingId}`, change),
    onSuccess: changed,
  });
}

export function useRemoveBuilding(buildingId: string) {
  const changed = useBuildingsChanged();
  return useMutation({
    mutationFn: () => api.delete<void>(`/api/buildings/${buildingId}`),
    onSuccess: changed,
  });
}

export function useRemoveFarm(farmId: string) {
  const changed = useBuildingsChanged();
  return useMutation({
    mutationFn: () => api.delete<void>(`/api/farms/${farmId}`),
    onSuccess: changed,
  });
}
