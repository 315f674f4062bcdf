import { useMutation, useQueryClient } from "@tanstack/react-query";
import type { FarmView } from "../../server/contracts/farms.ts";
import { api } from "./api-client.ts";

export interface NewFarm {
  cooperativeId: string;
  name: string;
  place: string;
  position: { latitudeDeg: number; longitudeDeg: number };
  farmerEmail: string | null;
  farmerName: string | null;
}

export function useCreateFarm() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (farm: NewFarm) => api.post<FarmView>("/api/farms", farm),
    onSuccess: () => client.invalidateQueries({ queryKey: ["farms"] }),
  });
}
