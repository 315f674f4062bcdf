import { useMutation, useQueryClient } from "@tanstack/react-query";
import type { BuildingView } from "../../../../server/contracts/buildings.ts";
import { api } from "../../../lib/api-client.ts";
import type { PinDraft } from "../pin/pin-draft.ts";

export interface PinRequest {
  draft: PinDraft;
  farFromFarmConfirmed: boolean;
}

/** Keeps a pinned building; lists of buildings and farms are then out of date. */
export function usePinBuilding() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ draft, farFromFarmConfirmed }: PinRequest) =>
      api.post<BuildingView>(`/api/farms/${draft.farmId}/buildings`, {
        name: draft.name,
        kind: draft.kind,
        shapeType: draft.shapeType,
        position: draft.position,
        footprint: { length: draft.length, width: draft.width, ridgeBearing: draft.ridgeBearing },
        farFromFarmConfirmed,
      }),
    onSuccess: (building) => {
      client.setQueryData(["buildings", building.id], building);
      // Not waited for: the way leads on to the survey, and the lists are fetched when they are next seen.
      void client.invalidateQueries({ queryKey: ["buildings"], exact: true });
      void client.invalidateQueries({ queryKey: ["farms"] });
    },
  });
}
