import { queryOptions } from "@tanstack/react-query";
import type { LibraryView } from "../../server/contracts/library.ts";
import { api } from "./api-client.ts";

/** Covers, screens, crops, animals, heaters and fuels. They change with a release only. */
export const libraryQuery = queryOptions({
  queryKey: ["library"],
  queryFn: ({ signal }) => api.get<LibraryView>("/api/library", { signal }),
  staleTime: Number.POSITIVE_INFINITY,
});
