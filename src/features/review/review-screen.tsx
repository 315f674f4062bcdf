import { useQuery } from "@tanstack/react-query";
import { useParams } from "react-router-dom";
import { PageState } from "../../components/page-state.tsx";
import { planQuery } from "../../lib/plan-queries.ts";
import { ReviewPage } from "./review-page.tsx";

/** One plan in plain words, for its farmer to answer and its adviser to explain. */
export function ReviewScreen() {
  const { planId = "" } = useParams();
  const plan = useQuery(planQuery(planId));
  if (plan.isError && !plan.data) {
    return <PageState kind="error" error={plan.error} onRetry={() => void plan.refetch()} />;
  }
  if (!plan.data) return <PageState kind="loading" />;
  return <ReviewPage plan={plan.data} />;
}
