import { queryOptions } from "@tanstack/react-query";
import type { ListOf } from "../../../../server/contracts/common.ts";
import type { ReviewLine } from "../../../../server/contracts/plans.ts";
import { api } from "../../../lib/api-client.ts";

/** The plans a person takes part in. */
export const reviewsQuery = queryOptions({
  queryKey: ["reviews"],
  queryFn: async ({ signal }) => (await api.get<ListOf<ReviewLine>>("/api/reviews", { signal })).items,
});
