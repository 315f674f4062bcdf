import { Link } from "react-router-dom";
import type { BuildingSummary } from "../../../server/contracts/buildings.ts";
import type { FarmView } from "../../../server/contracts/farms.ts";
import { BuildingOutline } from "../../components/building-outline.tsx";
import { verdictKind, verdictWords } from "../../components/plan/verdict.ts";
import { VerdictMark } from "../../components/plan/verdict-mark.tsx";
import { counted } from "../../lib/format.ts";
import type { Units } from "../../lib/units.ts";

const MOST_DRAWN = 6;

function Houses({ buildings, units }: { buildings: BuildingSummary[]; units: Units }) {
  return (
    <ul className="m-0 flex list-none flex-wrap items-end gap-x-5 gap-y-2 p-0">
      {buildings.slice(0, MOST_DRAWN).map((building) => {
        const kind = verdictKind(building.plan);
        return (
          <li key={building.id} className="relative min-w-16">
            <BuildingOutline
              shapeType={building.shapeType}
              outline={building.outline}
              size={{ width: 52, height: 32 }}
              status={kind === "unfinished" ? "unfinished" : "holds"}
            />
            <span className="absolute -top-2 left-12">
              <VerdictMark kind={kind} size={18} />
            </span>
            <span className="block max-w-26 truncate text-xs text-ink-2">
              {building.name}
              <span className="sr-only">{`: ${verdictWords(building.plan, units)}`}</span>
            </span>
          </li>
        );
      })}
    </ul>
  );
}

interface FarmLineProps {
  farm: FarmView;
  /** Those of the farm's buildings that the reader may open. */
  buildings: BuildingSummary[];
  units: Units;
}

/** A farm by its houses: what stands there and whether it holds, before a word is read. */
export function FarmLine({ farm, buildings, units }: FarmLineProps) {
  const named = (role: "advisor" | "farmer") =>
    farm.people
      .filter((person) => person.role === role)
      .map((person) => person.name)
      .join(", ");
  const hidden = farm.buildingCount - buildings.length;
  return (
    <li className="border-b border-rule">
      <Link
        to={`/farms/${farm.id}`}
        className="grid min-h-16 items-center gap-x-8 gap-y-2 bg-sheet px-4 py-3 text-ink no-underline hover:bg-trough md:grid-cols-[minmax(0,4fr)_minmax(0,5fr)_minmax(0,4fr)]"
      >
        <span>
          <b className="block font-sign text-lg">{farm.name}</b>
          <span className="block text-sm text-ink-2">{farm.place}</span>
        </span>
        {buildings.length > 0 ? (
          <Houses buildings={buildings} units={units} />
        ) : (
          <span className="text-ink-2">
            {hidden > 0 ? `${counted(hidden, "building")}, not shared` : "No buildings yet"}
          </span>
        )}
        <span className="text-sm text-ink-2">
          <span className="block text-ink">{named("farmer") || "No farmer yet"}</span>
          {`advised by ${named("advisor") || "nobody yet"}`}
        </span>
      </Link>
    </li>
  );
}
