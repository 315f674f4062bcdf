import { Link } from "react-router-dom";
import type { BuildingSummary } from "../../../../server/contracts/buildings.ts";
import { BuildingOutline } from "../../../components/building-outline.tsx";
import { buttonLook } from "../../../components/button.tsx";
import { verdictKind, verdictWords } from "../../../components/plan/verdict.ts";
import { VerdictMark } from "../../../components/plan/verdict-mark.tsx";
import type { Units } from "../../../lib/units.ts";
import { houseFacts, houseLine } from "./house-facts.ts";

interface HouseRowProps {
  building: BuildingSummary;
  units: Units;
  chosen: boolean;
  onChoose(): void;
}

/** One house of the list. Chosen, it opens with its figures and the way in. */
export function HouseRow({ building, units, chosen, onChoose }: HouseRowProps) {
  const kind = verdictKind(building.plan);
  const weak = kind === "holds" || kind === "notApplicable";
  const worked = building.plan !== null && kind !== "unfinished";
  return (
    <li
      className={`border-b border-rule ${chosen ? "border-l-[6px] border-l-ink bg-trough" : "bg-limewash"}`}
      data-house={building.id}
    >
      <button
        type="button"
        aria-expanded={chosen}
        className="flex min-h-15 w-full items-center gap-4 px-4 py-2 text-left hover:bg-trough"
        onClick={onChoose}
      >
        <BuildingOutline
          shapeType={building.shapeType}
          outline={building.outline}
          size={{ width: 48, height: 30 }}
          status={kind === "unfinished" ? "unfinished" : "holds"}
        />
        <span className="min-w-0 flex-1">
          <b className="block leading-tight break-words">{building.name}</b>
          <span className="block text-sm text-ink-2">{building.farmName}</span>
        </span>
        <span className="flex-none text-right">
          <span
            className={`flex items-center justify-end gap-2 text-sm ${kind === "short" ? "text-redlead" : ""} ${weak ? "text-ink-2" : "font-bold"}`}
          >
            <VerdictMark kind={kind} size={20} />
            {verdictWords(building.plan, units)}
          </span>
          <span className="block text-sm text-ink-2">{houseLine(building, units)}</span>
        </span>
      </button>
      {chosen ? (
        <div className="flex flex-wrap items-end justify-between gap-x-4 gap-y-3 px-4 pb-3">
          <dl className="m-0 flex flex-wrap gap-x-5 gap-y-1">
            {houseFacts(building, units).map((fact) => (
              <div key={fact.name} className="flex flex-col-reverse">
                <dt className="text-xs text-ink-2">{fact.name}</dt>
                <dd className="m-0 font-bold">{fact.value}</dd>
              </div>
            ))}
          </dl>
          <Link to={`/buildings/${building.id}/${worked ? "sizing" : "survey"}`} className={buttonLook()}>
            {worked ? "Open building" : "Go on with the survey"}
          </Link>
        </div>
      ) : null}
    </li>
  );
}
