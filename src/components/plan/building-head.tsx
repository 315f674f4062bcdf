import { ArrowLeft } from "lucide-react";
import type { ReactNode } from "react";
import { Link, NavLink } from "react-router-dom";
import type { BuildingView } from "../../../server/contracts/buildings.ts";
import { dayAndClock, joined } from "../../lib/format.ts";
import type { Units } from "../../lib/units.ts";
import { BuildingOutline } from "../building-outline.tsx";
import { shapeNames } from "./shape-names.ts";

interface BuildingHeadProps {
  building: BuildingView;
  units: Units;
  /** Where the answers are, or how far the work is. */
  status?: ReactNode;
  /** The one main action, top right. */
  action?: ReactNode;
  /** On a phone the action stands at the foot of the screen instead. */
  actionAtFoot?: boolean;
}

const tabs = [
  { to: "survey", label: "Survey" },
  { to: "heat", label: "Heat balance" },
  { to: "sizing", label: "Heater sizing" },
];

/** The building's title block and the tabs of its pages. */
export function BuildingHead({ building, units, status, action, actionAtFoot = false }: BuildingHeadProps) {
  const width = units.figure(building.widthM, "length", { decimals: 1 });
  const size = `${width.value} × ${joined(units.figure(building.lengthM, "length", { decimals: 1 }))}`;
  const cells = [
    { name: "Plan size", value: size },
    { name: "Floor", value: units.text(building.floorAreaM2, "area") },
    { name: "Survey", value: `${building.answered} of ${building.questions} answered` },
    {
      name: "Worked out",
      value: building.plan
        ? `${dayAndClock(building.plan.createdAt)}${building.plan.outdated ? ", survey changed since" : ""}`
        : "not yet",
    },
  ];
  const foot = actionAtFoot || !action;
  return (
    <header className="relative bg-sheet print:hidden">
      <div className="flex min-h-[72px] items-stretch border-b border-rule-strong max-md:min-h-15">
        <Link
          to={`/farms/${building.farmId}`}
          aria-label={`Back to ${building.farmName}`}
          className="flex w-13 items-center justify-center md:hidden"
        >
          <ArrowLeft aria-hidden="true" />
        </Link>
        <div
          className={`flex min-w-0 flex-1 items-center gap-4 py-2 md:px-4 ${status ? "max-md:pr-44" : ""}`}
        >
          <span className="max-md:hidden">
            <BuildingOutline
              shapeType={building.shapeType}
              outline={building.outline}
              size={{ width: 66, height: 36 }}
            />
          </span>
          <div className="min-w-0">
            <h1 className="m-0 truncate font-sign text-xl font-extrabold">
              {building.name}
              <span className="max-md:hidden">{`, ${building.farmName}`}</span>
            </h1>
            <p className="m-0 truncate text-sm text-ink-2">
              <span className="md:hidden">{building.farmName}</span>
              <span className="max-md:hidden">{shapeNames[building.shapeType]}</span>
            </p>
          </div>
        </div>
        <dl className="m-0 flex max-lg:hidden">
          {cells.map((cell) => (
            <div key={cell.name} className="flex flex-col justify-center border-l border-rule px-5">
              <dt className="text-xs text-ink-2">{cell.name}</dt>
              <dd className="m-0 text-sm font-bold whitespace-nowrap">{cell.value}</dd>
            </div>
          ))}
        </dl>
      </div>
      <div className="flex min-h-12 flex-wrap items-stretch border-b-2 border-ink">
        <nav aria-label="Pages of this building" className="flex">
          {tabs.map((tab) => (
            <NavLink
              key={tab.to}
              to={`/buildings/${building.id}/${tab.to}`}
              className={({ isActive }) =>
                `flex min-h-12 items-center px-4 text-ink no-underline max-md:px-3 max-md:text-sm ${isActive ? "bg-ink font-bold text-sheet" : "hover:bg-trough"}`
              }
            >
              {tab.label}
            </NavLink>
          ))}
        </nav>
        <div
          className={`ml-auto flex flex-wrap items-center gap-3 md:px-4 md:py-0.5 ${foot ? "" : "max-md:w-full max-md:px-4 max-md:py-2"}`}
        >
          {status ? (
            <div className="text-sm text-ink-2 max-md:absolute max-md:top-0 max-md:right-4 max-md:flex max-md:h-15 max-md:max-w-40 max-md:items-center">
              {status}
            </div>
          ) : null}
          {action ? <div className={actionAtFoot ? "max-md:hidden" : ""}>{action}</div> : null}
        </div>
      </div>
    </header>
  );
}
