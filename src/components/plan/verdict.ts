import type { PlanSummary } from "../../../server/contracts/buildings.ts";
import type { Units } from "../../lib/units.ts";
import type { OutlineStatus } from "../building-outline.tsx";

export type VerdictKind = OutlineStatus | "notApplicable";

/** Spare heat below this share of the need counts as nothing spare. */
const SPARE_FRAC = 0.1;

/** One of five standings of a house on the coldest night, for marks, filters and sorting. */
export function verdictKind(plan: PlanSummary | null): VerdictKind {
  if (plan === null || plan.verdict === "cannotSay") return "unfinished";
  if (plan.verdict === "notApplicable") return "notApplicable";
  if (plan.verdict !== "holds") return "short";
  return plan.installedW < plan.requiredW * (1 + SPARE_FRAC) && plan.requiredW > 0 ? "tight" : "holds";
}

/** The standing in words: never colour alone. */
export function verdictWords(plan: PlanSummary | null, units: Units): string {
  const kind = verdictKind(plan);
  if (plan === null) return "Not worked out";
  switch (kind) {
    case "short":
      return `Short by ${units.heat(plan.shortW)}`;
    case "tight":
      return "Nothing spare";
    case "holds":
      return "Enough heat";
    case "notApplicable":
      return "Needs no heater";
    case "unfinished":
      return "Cannot say yet";
  }
}
