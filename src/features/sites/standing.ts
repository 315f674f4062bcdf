import type { PlanSummary } from "../../../server/contracts/buildings.ts";
import { verdictKind, verdictWords } from "../../components/plan/verdict.ts";
import type { Units } from "../../lib/units.ts";

/** The standing on the coldest night in words; a house that loses its crop or stock is told apart from one that is only cool. */
export function nightWords(plan: PlanSummary | null, units: Units): string {
  if (plan !== null && verdictKind(plan) === "short") {
    return plan.verdict === "belowCritical" ? "Below critical" : "Below set-point";
  }
  return verdictWords(plan, units);
}

/** Where it settles, or why nothing can be said. */
export function nightDetail(
  row: { plan: PlanSummary | null; answered: number; questions: number },
  units: Units,
): string {
  const { plan } = row;
  if (plan === null) return `${row.answered} of ${row.questions} answered`;
  if (plan.verdict === "cannotSay") return "answers do not fit together";
  if (plan.verdict === "notApplicable") return "";
  return verdictKind(plan) === "short"
    ? `settles at ${units.temperature(plan.settlesAtC)}`
    : `keeps ${units.temperature(plan.setpointC)}`;
}
