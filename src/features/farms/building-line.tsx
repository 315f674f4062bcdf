import { Pencil } from "lucide-react";
import { useState } from "react";
import { Link } from "react-router-dom";
import type { BuildingSummary } from "../../../server/contracts/buildings.ts";
import { BuildingOutline } from "../../components/building-outline.tsx";
import { verdictKind, verdictWords } from "../../components/plan/verdict.ts";
import { VerdictMark } from "../../components/plan/verdict-mark.tsx";
import type { Units } from "../../lib/units.ts";
import { ChangeBuilding } from "./change-building.tsx";

interface BuildingLineProps {
  building: BuildingSummary;
  units: Units;
  mayChange: boolean;
}

/** One house of a farm, with its standing, and a way to rename or remove it. */
export function BuildingLine({ building, units, mayChange }: BuildingLineProps) {
  const [changing, setChanging] = useState(false);
  const kind = verdictKind(building.plan);
  return (
    <li className="flex border-b border-rule bg-sheet">
      <Link
        to={`/buildings/${building.id}/${building.plan ? "sizing" : "survey"}`}
        className="flex min-h-16 min-w-0 flex-1 flex-wrap items-center gap-x-4 gap-y-1 px-3 py-2 text-ink no-underline hover:bg-trough"
      >
        <BuildingOutline
          shapeType={building.shapeType}
          outline={building.outline}
          size={{ width: 56, height: 32 }}
          status={kind === "notApplicable" ? "holds" : kind}
        />
        <span className="min-w-32 flex-1">
          <b className="block">{building.name}</b>
          <span className="block text-sm text-ink-2">
            {`${units.text(building.floorAreaM2, "area")}, ${building.answered} of ${building.questions} answered`}
          </span>
        </span>
        <span className={`flex items-center gap-2 ${kind === "short" ? "font-bold text-redlead" : ""}`}>
          <VerdictMark kind={kind} />
          {verdictWords(building.plan, units)}
        </span>
      </Link>
      {mayChange ? (
        <button
          type="button"
          aria-label={`Change or remove ${building.name}`}
          className="flex w-13 flex-none items-center justify-center border-l border-rule hover:bg-trough"
          onClick={() => setChanging(true)}
        >
          <Pencil size={18} aria-hidden="true" />
        </button>
      ) : null}
      {changing ? <ChangeBuilding building={building} onClose={() => setChanging(false)} /> : null}
    </li>
  );
}
