import { useMutation, useQueryClient } from "@tanstack/react-query";
import type { Role } from "../../../server/contracts/people.ts";
import { api } from "../../lib/api-client.ts";

export interface Invitation {
  name: string;
  email: string;
  role: Role;
}

/** Farms show who works on them, so they are out of date with the people. */
function usePeopleChanged(cooperativeId: string) {
  const client = useQueryClient();
  return () =>
    Promise.all([
      client.invalidateQueries({ queryKey: ["cooperatives", cooperativeId] }),
      client.invalidateQueries({ queryKey: ["farms"] }),
    ]);
}

export function useInvite(cooperativeId: string) {
  const changed = usePeopleChanged(cooperativeId);
  return useMutation({
    mutationFn: (invitation: Invitation) =>
      api.post<unknown>(`/api/cooperatives/${cooperativeId}/people`, invitation),
    onSuccess: changed,
  });
}

export function useRemoveRole(cooperativeId: string) {
  const changed = usePeopleChanged(cooperativeId);
  return useMutation({
    mutationFn: ({ personId, role }: { personId: string; role: Role }) =>
      api.delete<void>(`/api/cooperatives/${cooperativeId}/people/${personId}/${role}`),
    onSuccess: changed,
  });
}
