import type { SiteRow } from "../../../server/contracts/sites.ts";
import { type VerdictKind, verdictKind } from "../../components/plan/verdict.ts";

export const sortKeys = ["urgency", "name", "short", "below", "hours", "kwh", "floor", "known"] as const;
export type SortKey = (typeof sortKeys)[number];

const rank: Record<VerdictKind, number> = { short: 0, tight: 1, unfinished: 2, holds: 3, notApplicable: 4 };

/** Degrees by which the house falls under its set-point on the coldest night; 0 where it holds. */
export function degreesBelow(row: SiteRow): number | null {
  const { plan } = row;
  if (plan === null || plan.verdict === "cannotSay" || plan.verdict === "notApplicable") return null;
  return Math.max(0, plan.setpointC - plan.settlesAtC);
}

const values: Record<SortKey, (row: SiteRow) => number | string | null> = {
  urgency: (row) => rank[verdictKind(row.plan)] * 1e3 - (degreesBelow(row) ?? 0),
  name: (row) => row.buildingName.toLowerCase(),
  short: (row) => (row.plan === null ? null : -row.plan.shortW),
  below: (row) => {
    const below = degreesBelow(row);
    return below === null ? null : -below;
  },
  hours: (row) => row.plan?.hoursToCriticalLow ?? null,
  kwh: (row) => (row.plan === null ? null : -row.plan.heaterKwhM2),
  floor: (row) => -row.floorAreaM2,
  known: (row) => row.plan?.knownFrac ?? -1,
};

/** Sorted rows; houses without the figure come last, whichever way it is sorted. */
export function sortSites(rows: SiteRow[], key: SortKey, reversed: boolean): SiteRow[] {
  const value = values[key];
  const direction = reversed ? -1 : 1;
  return [...rows].sort((a, b) => {
    const left = value(a);
    const right = value(b);
    if (left === null || right === null) return Number(left === null) - Number(right === null);
    if (left === right) return a.buildingName.localeCompare(b.buildingName);
    return left < right ? -direction : direction;
  });
}
