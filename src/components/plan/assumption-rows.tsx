import type { PlanAssumption } from "../../../server/engine/plan/plan-types.ts";
import type { Units } from "../../lib/units.ts";
import { OriginGlyph } from "../form/origin-glyph.tsx";
import { originWords } from "../form/origin-words.ts";
import { assumptionText } from "./assumption-text.ts";

/** Answers with value, origin and source, one a line. */
export function AssumptionRows({ assumptions, units }: { assumptions: PlanAssumption[]; units: Units }) {
  return (
    <ul className="m-0 list-none p-0">
      {assumptions.map((assumption) => (
        <li
          key={assumption.field}
          className="grid grid-cols-[18px_minmax(0,1fr)_auto] items-baseline gap-x-2 border-b border-rule py-1.5 text-sm"
        >
          <OriginGlyph origin={assumption.origin} />
          <span>
            {assumption.label}
            <span className="block text-xs text-ink-2">
              {originWords[assumption.origin].long}
              {assumption.source ? `. ${assumption.source}` : ""}
            </span>
          </span>
          <span
            className={`text-right font-bold ${originWords[assumption.origin].strength === "assumed" ? "border-b-2 border-dashed border-rule-strong" : ""}`}
          >
            {assumptionText(assumption, units)}
          </span>
        </li>
      ))}
    </ul>
  );
}
