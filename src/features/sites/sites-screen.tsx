import { useQuery } from "@tanstack/react-query";
import { Download, Printer } from "lucide-react";
import { lazy, Suspense, useState } from "react";
import { useSearchParams } from "react-router-dom";
import { Button } from "../../components/button.tsx";
import { downloadCsv } from "../../components/chart/csv.ts";
import { PageState } from "../../components/page-state.tsx";
import { verdictKind } from "../../components/plan/verdict.ts";
import { Segmented } from "../../components/segmented.tsx";
import { day } from "../../lib/format.ts";
import { meQuery } from "../../lib/me-query.ts";
import { sitesQuery } from "../../lib/sites-query.ts";
import { useUnits } from "../../lib/units.ts";
import { Answer } from "./answer.tsx";
import { type SortKey, sortKeys, sortSites } from "./site-order.ts";
import { sitesCsv } from "./sites-csv.ts";
import { SitesTable } from "./sites-table.tsx";

const SitesMap = lazy(async () => ({ default: (await import("./sites-map.tsx")).SitesMap }));

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
  { value: "holds" as const, label: "Enough" },
];

/** The manager's page: which houses hold, which do not, and which nobody knows. Filter and order live in the address. */
export function SitesScreen() {
  const units = useUnits();
  const [chosenId, setChosenId] = useState<string | null>(null);
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
  const standing = pick("standing", ["all", "short", "tight", "unfinished", "holds"] as const, "all");
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
  const show = (buildingId: string) => {
    setChosenId(buildingId);
    document.querySelector(`[data-row="${CSS.escape(buildingId)}"]`)?.scrollIntoView({ block: "center" });
  };
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
    <div className="flex flex-1 flex-col">
      <div className="flex flex-wrap items-center justify-between gap-4 border-b border-rule-strong bg-sheet px-5 py-4">
        <h1 className="sr-only print:not-sr-only print:w-full print:text-lg">
          {`Compare sites, ${sites.data.cooperativeName}`}
          <span className="hidden print:inline">{`, ${day(new Date().toISOString())}`}</span>
        </h1>
        <Answer rows={sites.data.rows} units={units} />
        <div className="flex flex-wrap gap-3 print:hidden">
          <Button kind="plain" onClick={() => downloadCsv("sites.csv", sitesCsv(sorted, units))}>
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
      <div className="grid min-h-0 flex-1 border-t border-rule-strong xl:grid-cols-[minmax(0,1fr)_340px]">
        <div className="overflow-x-auto px-3 pb-8 max-md:px-5">
          <SitesTable rows={sorted} units={units} sort={sort} chosenId={chosenId} onSort={order} />
          <p className="max-w-[86ch] px-2 text-sm text-ink-2">
            Circle: where the house settles. Triangle: the temperature wanted. Hatched: what is missing.
            “Known” is the share of answers that were measured or read off a plate or a bill. “Until critical”
            is how long a house takes to its critical temperature when all heat stops on that night; the true
            time lies somewhere in the range.
          </p>
        </div>
        <section
          aria-labelledby="sites-map"
          className="border-ink max-xl:border-t-2 max-md:hidden xl:border-l-2 print:hidden"
        >
          <div className="sticky top-0 p-4">
            <h2 id="sites-map" className="m-0 mb-2 font-sign text-lg font-bold">
              Where they are
            </h2>
            <div className="h-80 border border-ink">
              <Suspense fallback={<PageState kind="loading" words="Fetching the map" />}>
                <SitesMap rows={sorted} onChoose={show} />
              </Suspense>
            </div>
            <p className="text-sm text-ink-2">
              Numbers match the table. Filled red: will not hold. Dashed: not known.
            </p>
          </div>
        </section>
      </div>
    </div>
  );
}
