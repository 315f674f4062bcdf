import { useMutation, useQueryClient } from "@tanstack/react-query";
import type { MeView } from "../../server/contracts/people.ts";
import { api, setCsrfToken } from "./api-client.ts";
import { meKey } from "./units.ts";

export type Preferences = Partial<Pick<MeView, "units" | "theme">> & {
  activeRole?: NonNullable<MeView["activeRole"]>;
  activeCooperativeId?: string;
};

/** Changes units, theme or role; shown at once and taken back when the server refuses. */
export function usePreferences() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (change: Preferences) => api.patch<MeView>("/api/me/preferences", change),
    onMutate: (change) => {
      const before = client.getQueryData<MeView>(meKey);
      if (before !== undefined) client.setQueryData<MeView>(meKey, { ...before, ...change });
      return { before };
    },
    onError: (_error, _change, context) => client.setQueryData(meKey, context?.before),
    onSuccess: (me) => {
      setCsrfToken(me.csrfToken);
      client.setQueryData(meKey, me);
    },
  });
}
