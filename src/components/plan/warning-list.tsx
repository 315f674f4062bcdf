import { useState } from "react";
import type { PlanWarning } from "../../../server/engine/plan/plan-types.ts";

const severityOrder: PlanWarning["severity"][] = ["block", "caution", "note"];
const severityWords: Record<PlanWarning["severity"], string> = {
  block: "Must be put right",
  caution: "Caution",
  note: "Note",
};
const OPEN_AT_ONCE = 3;

function Mark({ severity }: { severity: PlanWarning["severity"] }) {
  return (
    <svg width="24" height="24" aria-hidden="true" focusable="false" className="flex-none">
      {severity === "block" ? (
        <>
          <circle cx="12" cy="12" r="11" fill="var(--color-redlead)" />
          <text
            x="12"
            y="17"
            textAnchor="middle"
            fontSize="15"
            fontWeight="800"
            fill="var(--color-on-redlead)"
          >
            !
          </text>
        </>
      ) : severity === "caution" ? (
        <path
          d="M12 2L22 12L12 22L2 12Z"
          fill="var(--color-straw)"
          stroke="var(--color-ink)"
          strokeWidth="1.4"
        />
      ) : (
        <circle
          cx="12"
          cy="12"
          r="9"
          fill="none"
          stroke="var(--color-ink-2)"
          strokeWidth="1.6"
          strokeDasharray="3 3"
        />
      )}
    </svg>
  );
}

interface WarningListProps {
  warnings: PlanWarning[];
  /** A link to the survey answer a warning concerns. */
  renderLink?: (field: string) => React.ReactNode;
}

/** Worst first; three at once, the rest behind a button. */
export function WarningList({ warnings, renderLink }: WarningListProps) {
  const [all, setAll] = useState(false);
  const sorted = [...warnings].sort(
    (a, b) => severityOrder.indexOf(a.severity) - severityOrder.indexOf(b.severity),
  );
  const shown = all ? sorted : sorted.slice(0, OPEN_AT_ONCE);
  const hidden = sorted.length - shown.length;
  if (sorted.length === 0) return null;
  return (
    <section aria-label="Warnings">
      <ul className="m-0 list-none p-0">
        {shown.map((warning) => (
          <li
            key={`${warning.code}-${warning.field ?? ""}-${warning.message}`}
            className="grid grid-cols-[24px_minmax(0,1fr)] gap-3 border-b border-rule py-2.5"
          >
            <Mark severity={warning.severity} />
            <div className="text-sm">
              <p className="m-0 font-bold">
                <span className="sr-only">{`${severityWords[warning.severity]}: `}</span>
                {warning.message}
              </p>
              <p className="m-0 text-ink-2">
                {warning.action} {warning.field && renderLink ? renderLink(warning.field) : null}
              </p>
            </div>
          </li>
        ))}
      </ul>
      {hidden > 0 ? (
        <button
          type="button"
          onClick={() => setAll(true)}
          className="min-h-11 text-sm font-semibold text-bottle underline underline-offset-4 hover:text-bottle-deep"
        >
          {`${hidden} more`}
        </button>
      ) : null}
    </section>
  );
}
