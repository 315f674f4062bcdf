import { useQuery } from "@tanstack/react-query";
import { Download, Printer } from "lucide-react";
import { useSearchParams } from "react-router-dom";
import type { SiteRow } from "../../../server/contracts/sites.ts";
import { Button } from "../../components/button.tsx";
import { PageState } from "../../components/page-state.tsx";
import { type VerdictKind, verdictKind } from "../../components/plan/verdict.ts";
import { Segmented } from "../../components/segmented.tsx";
import { counted } from "../../lib/format.ts";
import { meQuery } from "../../lib/me-query.ts";
import { sitesQuery } from "../../lib/sites-query.ts";
import { type Units, useUnits } from "../../lib/units.ts";
import { type SortKey, sortKeys, sortSites } from "./site-order.ts";
import { sitesCsv } from "./sites-csv.ts";
import { SitesTable } from "./sites-table.tsx";

const kindFilters = [
  { value: "all" as const, label: "All" },
  { value: "greenhouse" as const, label: "Glass and film" },
  { value: "barn" as const, label: "Stock barns" },
];
const standingFilters = [
  { value: "all" as const, label: "All" },
  { value: "short" as const, label: "Short" },
  { value: "tight" as const, label: "Nothing spare" },
  { value: "unfinished" as const, label: "Not known" },
];

function count(rows: SiteRow[], kind: VerdictKind): number {
  return rows.filter((row) => verdictKind(row.plan) === kind).length;
}

/** The answer first, in one sentence with the numbers. */
function Answer({ rows, units }: { rows: SiteRow[]; units: Units }) {
  const short = rows.filter((row) => verdictKind(row.plan) === "short");
  const shortW = short.reduce((sum, row) => sum + (row.plan?.shortW ?? 0), 0);
  const farms = new Set(rows.map((row) => row.farmId)).size;
  const unknown = count(rows, "unfinished");
  return (
    <p className="m-0 max-w-[70ch] text-lg">
      <b>{counted(rows.length, "building")}</b> on <b>{counted(farms, "farm")}</b>.{" "}
      {short.length === 0 ? (
        <b>None is known to be short of heat on the coldest night in twenty years.</b>
      ) : (
        <b className="text-redlead">
          {`${short.length} ${short.length === 1 ? "is" : "are"} short of heat on the coldest night in twenty years, by ${units.heat(shortW)} together.`}
        </b>
      )}{" "}
      {`${count(rows, "tight")} hold with nothing spare, ${count(rows, "holds")} hold, ${count(rows, "notApplicable")} need no heater, `}
      <b>{`${unknown} ${unknown === 1 ? "is" : "are"} not known.`}</b>
    </p>
  );
}

function download(rows: SiteRow[], units: Units): void {
  const link = document.createElement("a");
  link.href = URL.createObjectURL(
    new Blob([`\uFEFF${sitesCsv(rows, units)}`], { type: "text/csv;charset=utf-8" }),
  );
  link.download = "sites.csv";
  link.click();
  URL.revokeObjectURL(link.href);
}

/** The manager's page: which houses hold, which do not, and which nobody knows. Filter and order live in the address. */
export function SitesScreen() {
  const units = useUnits();
  const [search, setSearch] = useSearchParams();
  const { data: me } = useQuery(meQuery);
  const cooperativeId = me?.activeCooperativeId ?? "";
  const sites = useQuery({ ...sitesQuery(cooperativeId), enabled: cooperativeId !== "" });
  if (sites.isError && sites.data === undefined) {
    return <PageState kind="error" error={sites.error} onRetry={() => void sites.refetch()} />;
  }
  if (sites.data === undefined) return <PageState kind="loading" />;
  const pick = <T extends string>(name: string, allowed: readonly T[], fallback: T): T =>
    allowed.find((value) => value === search.get(name)) ?? fallback;
  const set = (name: string, value: string) =>
    setSearch(
      (before) => {
        before.set(name, value);
        return before;
      },
      { replace: true },
    );
  const kind = pick("kind", ["all", "greenhouse", "barn"] as const, "all");
  const standing = pick("standing", ["all", "short", "tight", "unfinished"] as const, "all");
  const sort = { key: pick("by", sortKeys, "urgency"), reversed: search.get("down") === "1" };
  const rows = sites.data.rows.filter(
    (row) =>
      (kind === "all" || row.kind === kind) && (standing === "all" || verdictKind(row.plan) === standing),
  );
  const sorted = sortSites(rows, sort.key, sort.reversed);
  const order = (key: SortKey) =>
    setSearch(
      (before) => {
        before.set("down", key === sort.key && !sort.reversed ? "1" : "0");
        before.set("by", key);
        return before;
      },
      { replace: true },
    );
  if (sites.data.rows.length === 0) {
    return (
      <PageState
        kind="empty"
        title="No buildings yet"
        words="Invite advisers under People. They add farms and pin buildings; each shows here once it is pinned."
      />
    );
  }
  return (
    <div className="flex flex-col">
      <div className="flex flex-wrap items-center justify-between gap-4 border-b border-rule-strong bg-sheet px-5 py-4">
        <h1 className="sr-only">Compare sites</h1>
        <Answer rows={sites.data.rows} units={units} />
        <div className="flex flex-wrap gap-3 print:hidden">
          <Button kind="plain" onClick={() => download(sorted, units)}>
            <Download size={18} aria-hidden="true" />
            Table as CSV
          </Button>
          <Button kind="plain" onClick={() => window.print()}>
            <Printer size={18} aria-hidden="true" />
            Print table
          </Button>
        </div>
      </div>
      <div className="flex flex-wrap items-center gap-x-8 gap-y-3 px-5 py-3 print:hidden">
        <Segmented
          label="Kind of building"
          options={kindFilters}
          value={kind}
          onChange={(value) => set("kind", value)}
        />
        <Segmented
          label="On the coldest night"
          options={standingFilters}
          value={standing}
          onChange={(value) => set("standing", value)}
        />
      </div>
      <div className="px-5 pb-8">
        {sorted.length === 0 ? (
          <p>No building fits this choice.</p>
        ) : (
          <SitesTable rows={sorted} units={units} sort={sort} onSort={order} />
        )}
        <p className="max-w-[80ch] text-sm text-ink-2">
          “Known” is the share of answers that were measured or read off a plate or a bill. “Until critical”
          is how long a house takes to its critical temperature when all heat stops on that night; the true
          time lies somewhere in the range.
        </p>
      </div>
    </div>
  );
}
