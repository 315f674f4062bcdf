import { queryOptions } from "@tanstack/react-query";
import type { MeView } from "../../server/contracts/people.ts";
import { api, setCsrfToken } from "./api-client.ts";
import { meKey } from "./units.ts";

/** The signed-in person; also takes up the token that every change carries. */
export const meQuery = queryOptions({
  queryKey: meKey,
  queryFn: async ({ signal }) => {
    const me = await api.get<MeView>("/api/me", { signal });
    setCsrfToken(me.csrfToken);
    return me;
  },
  staleTime: 60_000,
});
