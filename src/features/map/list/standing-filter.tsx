import { useId } from "react";
import type { VerdictKind } from "../../../components/plan/verdict.ts";
import { VerdictMark } from "../../../components/plan/verdict-mark.tsx";
import type { Standing } from "./house-order.ts";

const cells: { standing: Standing; label: string; mark?: VerdictKind }[] = [
  { standing: "all", label: "All" },
  { standing: "short", label: "Short", mark: "short" },
  { standing: "tight", label: "Tight", mark: "tight" },
  { standing: "unfinished", label: "Not known", mark: "unfinished" },
];

interface StandingFilterProps {
  value: Standing;
  counts: Record<Standing, number>;
  onChange(standing: Standing): void;
}

/** Which houses the list and the map show. Native radio buttons: arrow keys move the choice. */
export function StandingFilter({ value, counts, onChange }: StandingFilterProps) {
  const name = useId();
  return (
    <fieldset className="m-0 border-0 p-0">
      <legend className="sr-only">Show</legend>
      <span className="flex rounded-control border-[1.5px] border-rule-strong bg-sheet">
        {cells.map(({ standing, label, mark }, index) => (
          <label
            key={standing}
            className={`relative flex min-h-10 flex-auto cursor-pointer items-center justify-center gap-1.5 px-2 text-sm whitespace-nowrap has-focus-visible:z-10 has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-focus pointer-coarse:min-h-11 ${
              index > 0 ? "border-l-[1.5px] border-rule-strong" : ""
            } ${standing === value ? "bg-ink font-bold text-sheet" : "hover:bg-trough"}`}
          >
            <input
              type="radio"
              name={name}
              value={standing}
              checked={standing === value}
              onChange={() => onChange(standing)}
              className="sr-only"
            />
            {mark ? (
              <span className={standing === value ? "rounded-full bg-sheet text-ink" : ""}>
                <VerdictMark kind={mark} size={18} />
              </span>
            ) : null}
            {`${label} ${counts[standing]}`}
          </label>
        ))}
      </span>
    </fieldset>
  );
}
