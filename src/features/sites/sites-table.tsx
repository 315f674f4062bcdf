import { Link } from "react-router-dom";
import type { SiteRow } from "../../../server/contracts/sites.ts";
import { BuildingOutline } from "../../components/building-outline.tsx";
import { verdictKind, verdictWords } from "../../components/plan/verdict.ts";
import { VerdictMark } from "../../components/plan/verdict-mark.tsx";
import type { Units } from "../../lib/units.ts";
import { degreesBelow, type SortKey } from "./site-order.ts";

interface Column {
  key: SortKey;
  label: string;
  unit?: string;
  right?: boolean;
}

interface SitesTableProps {
  rows: SiteRow[];
  units: Units;
  sort: { key: SortKey; reversed: boolean };
  onSort(key: SortKey): void;
}

function hours(row: SiteRow): string {
  const { hoursToCriticalLow: low, hoursToCriticalHigh: high } = row.plan ?? {};
  if (low === null || low === undefined || high === null || high === undefined) return "–";
  return `${low.toFixed(1)} to ${high.toFixed(1)}`;
}

function Name({ row }: { row: SiteRow }) {
  const words = (
    <>
      <b>{row.buildingName}</b>
      {`, ${row.farmName}`}
    </>
  );
  if (!row.canOpen || row.plan === null) return <span>{words}</span>;
  return (
    <Link to={`/buildings/${row.buildingId}/sizing`} className="text-ink">
      {words}
    </Link>
  );
}

function Cell({ label, children }: { label: string; children: string }) {
  return (
    <td className="px-2 py-1.5 text-right whitespace-nowrap max-md:flex max-md:justify-between max-md:px-0 max-md:py-0.5">
      <span className="text-sm text-ink-2 md:hidden">{label}</span>
      {children}
    </td>
  );
}

/** Every house of the co-operative, one row each; on a phone each row is a small sheet. */
export function SitesTable({ rows, units, sort, onSort }: SitesTableProps) {
  const columns: Column[] = [
    { key: "name", label: "Building" },
    { key: "urgency", label: "Coldest night" },
    { key: "short", label: "Short", unit: units.symbol("power"), right: true },
    { key: "below", label: "Below set-point", unit: units.symbol("temperatureDifference"), right: true },
    { key: "hours", label: "Until critical", unit: "h", right: true },
    { key: "kwh", label: "Heat a year", unit: units.symbol("energyPerArea"), right: true },
    { key: "floor", label: "Floor", unit: units.symbol("area"), right: true },
    { key: "known", label: "Known", unit: "%", right: true },
  ];
  const direction = sort.reversed ? "descending" : "ascending";
  return (
    <table className="w-full border-collapse text-sm">
      <caption className="sr-only">Houses of the co-operative</caption>
      <thead className="max-md:hidden">
        <tr className="border-b-2 border-ink">
          {columns.map((column) => (
            <th
              key={column.key}
              scope="col"
              aria-sort={sort.key === column.key ? direction : "none"}
              className={`p-0 align-bottom font-semibold ${column.right ? "text-right" : "text-left"}`}
            >
              <button
                type="button"
                className={`min-h-11 w-full px-2 hover:bg-trough ${column.right ? "text-right" : "text-left"} ${sort.key === column.key ? "font-extrabold underline underline-offset-4" : ""}`}
                onClick={() => onSort(column.key)}
              >
                {column.label}
                {column.unit ? (
                  <span className="block text-xs font-normal text-ink-2">{column.unit}</span>
                ) : null}
              </button>
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => {
          const kind = verdictKind(row.plan);
          const figure = (
            value: number | null | undefined,
            unit: Parameters<Units["figure"]>[1],
            decimals?: number,
          ) => (value === null || value === undefined ? "–" : units.figure(value, unit, { decimals }).value);
          return (
            <tr
              key={row.buildingId}
              className="border-b border-rule hover:bg-trough max-md:block max-md:py-3 print:break-inside-avoid"
            >
              <th scope="row" className="py-1.5 pr-2 text-left font-normal max-md:block">
                <span className="flex items-center gap-3">
                  <BuildingOutline
                    shapeType={row.shapeType}
                    outline={row.outline}
                    size={{ width: 46, height: 26 }}
                    status={kind === "notApplicable" ? "holds" : kind}
                  />
                  <span>
                    <Name row={row} />
                    <span className="block text-xs text-ink-2">
                      {`${row.place}, ${row.country}; ${row.advisorName ?? "no adviser"}${row.plan?.outdated ? "; survey changed since the plan" : ""}`}
                    </span>
                  </span>
                </span>
              </th>
              <td className="px-2 py-1.5 max-md:block max-md:px-0">
                <span className="flex items-center gap-2 font-semibold">
                  <VerdictMark kind={kind} />
                  {verdictWords(row.plan, units)}
                </span>
              </td>
              <Cell label="Short">
                {row.plan && kind !== "unfinished" ? figure(row.plan.shortW, "power") : "–"}
              </Cell>
              <Cell label="Below set-point">{figure(degreesBelow(row), "temperatureDifference", 1)}</Cell>
              <Cell label="Hours until critical">{hours(row)}</Cell>
              <Cell label="Heat a year">{figure(row.plan?.heaterKwhM2, "energyPerArea", 0)}</Cell>
              <Cell label="Floor">{figure(row.floorAreaM2, "area")}</Cell>
              <Cell label="Known, %">{row.plan ? String(Math.round(row.plan.knownFrac * 100)) : "–"}</Cell>
            </tr>
          );
        })}
      </tbody>
    </table>
  );
}
