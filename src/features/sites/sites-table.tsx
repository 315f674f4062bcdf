import { Link } from "react-router-dom";
import type { SiteRow } from "../../../server/contracts/sites.ts";
import { BuildingOutline } from "../../components/building-outline.tsx";
import { type DataColumn, DataTable } from "../../components/data-table.tsx";
import { verdictKind } from "../../components/plan/verdict.ts";
import { VerdictMark } from "../../components/plan/verdict-mark.tsx";
import type { Units } from "../../lib/units.ts";
import { MissingHatch, NightStrip, StripAxis, stripScale } from "./night-strip.tsx";
import { degreesBelow, type SortKey } from "./site-order.ts";
import { nightDetail, nightWords } from "./standing.ts";

interface SitesTableProps {
  rows: SiteRow[];
  units: Units;
  sort: { key: SortKey; reversed: boolean };
  chosenId: string | null;
  onSort(key: SortKey): void;
}

function hours(row: SiteRow): string {
  const { hoursToCriticalLow: low, hoursToCriticalHigh: high } = row.plan ?? {};
  if (low === null || low === undefined || high === null || high === undefined) return "–";
  return `${low.toFixed(1)}\u00a0to\u00a0${high.toFixed(1)}`;
}

function Name({ row, units }: { row: SiteRow; units: Units }) {
  const kind = verdictKind(row.plan);
  const stale = row.plan?.outdated ? "; survey changed since" : "";
  return (
    <span className="flex items-center gap-3">
      <BuildingOutline
        shapeType={row.shapeType}
        outline={row.outline}
        size={{ width: 46, height: 26 }}
        status={kind === "notApplicable" ? "holds" : kind}
      />
      <span>
        {row.canOpen && row.plan !== null ? (
          <Link
            to={`/buildings/${row.buildingId}/sizing`}
            className="inline-flex items-center font-bold text-ink max-md:min-h-11"
          >
            {row.buildingName}
          </Link>
        ) : (
          <b>{row.buildingName}</b>
        )}
        <span className="block text-xs text-ink-2">
          {`${row.farmName}, ${row.country}; ${units.text(row.floorAreaM2, "area")}${stale}`}
        </span>
      </span>
    </span>
  );
}

function Standing({ row, units }: { row: SiteRow; units: Units }) {
  const kind = verdictKind(row.plan);
  return (
    <span className="flex items-center gap-2">
      <VerdictMark kind={kind} />
      <span className="max-md:text-left">
        <b className={`block leading-tight whitespace-nowrap ${kind === "short" ? "text-redlead" : ""}`}>
          {nightWords(row.plan, units)}
        </b>
        <span className="block text-xs whitespace-nowrap text-ink-2">{nightDetail(row, units)}</span>
      </span>
    </span>
  );
}

/** Every house of the co-operative, one row each; houses nobody has worked out are a class of their own. */
export function SitesTable({ rows, units, sort, chosenId, onSort }: SitesTableProps) {
  const scale = stripScale(rows.map((row) => row.plan));
  const figure = (
    value: number | null | undefined,
    kind: Parameters<Units["figure"]>[1],
    decimals?: number,
  ) => (value === null || value === undefined ? "–" : units.figure(value, kind, { decimals }).value);
  const right = { align: "right", sortable: true } as const;
  const columns: DataColumn<SiteRow, SortKey | "number" | "strip">[] = [
    { key: "number", header: "No.", align: "right", deskOnly: true, cell: (row) => rows.indexOf(row) + 1 },
    {
      key: "name",
      header: "Building",
      names: true,
      sortable: true,
      cell: (row) => <Name row={row} units={units} />,
    },
    {
      key: "urgency",
      header: "Coldest night",
      sortable: true,
      cell: (row) => <Standing row={row} units={units} />,
    },
    {
      key: "strip",
      header: `Outside to inside, ${units.symbol("temperature")}`,
      deskOnly: true,
      under: <StripAxis scale={scale} units={units} />,
      cell: (row) => <NightStrip plan={row.plan} scale={scale} units={units} />,
    },
    {
      key: "below",
      header: "Degrees short",
      unit: units.symbol("temperatureDifference"),
      ...right,
      cell: (row) => figure(degreesBelow(row), "temperatureDifference", 1),
    },
    {
      key: "short",
      header: "Short",
      unit: units.symbol("power"),
      ...right,
      cell: (row) => (degreesBelow(row) === null ? "–" : figure(row.plan?.shortW, "power")),
    },
    { key: "hours", header: "Until critical", unit: "h", ...right, cell: hours },
    {
      key: "kwh",
      header: "Heat a year",
      unit: units.symbol("energyPerArea"),
      ...right,
      cell: (row) => figure(row.plan?.heaterKwhM2, "energyPerArea", 0),
    },
    {
      key: "known",
      header: "Known",
      unit: "%",
      ...right,
      cell: (row) => (row.plan ? String(Math.round(row.plan.knownFrac * 100)) : "–"),
    },
  ];
  const sortable = (key: SortKey | "number" | "strip") => {
    if (key !== "number" && key !== "strip") onSort(key);
  };
  return (
    <>
      <MissingHatch />
      <DataTable
        caption="Houses of the co-operative"
        columns={columns}
        rows={rows}
        rowId={(row) => row.buildingId}
        chosenId={chosenId}
        sort={sort}
        onSort={sortable}
        empty="No building fits this choice."
      />
    </>
  );
}
