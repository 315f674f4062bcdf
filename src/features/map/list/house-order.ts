import type { BuildingSummary } from "../../../../server/contracts/buildings.ts";
import { type VerdictKind, verdictKind } from "../../../components/plan/verdict.ts";

const rank: Record<VerdictKind, number> = { short: 0, tight: 1, unfinished: 2, holds: 3, notApplicable: 4 };

/** Smaller is more urgent: first the standing, then how much heat is missing. */
export function urgency(building: BuildingSummary): number {
  const missingKw = (building.plan?.shortW ?? 0) / 1000;
  return rank[verdictKind(building.plan)] - missingKw / (missingKw + 1000);
}

export const standings = ["all", "short", "tight", "unfinished", "holds"] as const;
export type Standing = (typeof standings)[number];

/** A house that needs no heater stands among those that hold. */
function standingOf(building: BuildingSummary): Standing {
  const kind = verdictKind(building.plan);
  return kind === "notApplicable" ? "holds" : kind;
}

export function countStandings(buildings: BuildingSummary[]): Record<Standing, number> {
  const counts: Record<Standing, number> = {
    all: buildings.length,
    short: 0,
    tight: 0,
    unfinished: 0,
    holds: 0,
  };
  for (const building of buildings) counts[standingOf(building)] += 1;
  return counts;
}

const plain = (text: string) =>
  text
    .normalize("NFD")
    .replace(/\p{Diacritic}/gu, "")
    .toLowerCase();

/** Houses whose name or farm holds every word of the text, most urgent first. */
export function findHouses(
  buildings: BuildingSummary[],
  { text, standing }: { text: string; standing: Standing },
): BuildingSummary[] {
  const words = plain(text).split(/\s+/).filter(Boolean);
  return buildings
    .filter((building) => standing === "all" || standingOf(building) === standing)
    .filter((building) =>
      words.every((word) => plain(`${building.name} ${building.farmName}`).includes(word)),
    )
    .sort((a, b) => urgency(a) - urgency(b) || a.name.localeCompare(b.name));
}
