import type { PlanAssumption } from "../../../server/engine/plan/plan-types.ts";
import type { Units } from "../../lib/units.ts";
import { originWords } from "../form/origin-words.ts";
import { AssumptionRows } from "./assumption-rows.tsx";

/** What a plan rests on: the weakest ground first, the well known behind a fold. */
export function AssumptionGroups({ assumptions, units }: { assumptions: PlanAssumption[]; units: Units }) {
  const by = (strength: "assumed" | "told" | "known") =>
    assumptions.filter((entry) => originWords[entry.origin].strength === strength);
  const groups = [
    { title: "Typical values nobody checked", entries: by("assumed"), open: true },
    { title: "Told or estimated", entries: by("told"), open: true },
    { title: "Measured, or read from plates and bills", entries: by("known"), open: false },
  ].filter((group) => group.entries.length > 0);
  return (
    <section aria-labelledby="rests-heading">
      <h2 id="rests-heading" className="m-0 font-sign text-lg font-bold">
        What this rests on
      </h2>
      {groups.map((group) => (
        <details key={group.title} open={group.open} className="border-b border-rule-strong">
          <summary className="flex min-h-11 cursor-pointer items-center gap-2 font-semibold">
            {`${group.title} (${group.entries.length})`}
          </summary>
          <AssumptionRows assumptions={group.entries} units={units} />
        </details>
      ))}
    </section>
  );
}
