import type { SiteRow } from "../../../server/contracts/sites.ts";
import { type VerdictKind, verdictKind } from "../../components/plan/verdict.ts";
import { counted } from "../../lib/format.ts";
import type { Units } from "../../lib/units.ts";

const isAre = (count: number) => (count === 1 ? "is" : "are");

/** The answer first, in one sentence with the numbers. */
export function Answer({ rows, units }: { rows: SiteRow[]; units: Units }) {
  const count = (kind: VerdictKind) => rows.filter((row) => verdictKind(row.plan) === kind).length;
  const short = rows.filter((row) => verdictKind(row.plan) === "short");
  const critical = short.filter((row) => row.plan?.verdict === "belowCritical").length;
  const shortW = short.reduce((sum, row) => sum + (row.plan?.shortW ?? 0), 0);
  const farms = new Set(rows.map((row) => row.farmId)).size;
  const rest = [
    { words: "with nothing spare", number: count("tight") },
    { words: "with heat to spare", number: count("holds") },
  ].filter(({ number }) => number > 0);
  const idle = count("notApplicable");
  const unknown = count("unfinished");
  return (
    <p className="m-0 max-w-[78ch] text-lg">
      <b>{counted(rows.length, "building")}</b> on <b>{counted(farms, "farm")}</b>.{" "}
      {short.length === 0 ? (
        <b>None is known to be short of heat on the coldest night.</b>
      ) : (
        <b className="text-redlead">
          {`${short.length} will not hold on the coldest night, by ${units.heat(shortW)} together${critical > 0 ? `; ${critical} of them would fall below what crop or stock can stand` : ""}.`}
        </b>
      )}
      {rest.map(({ words, number }) => ` ${number} ${number === 1 ? "holds" : "hold"} ${words}.`)}
      {idle > 0 ? ` ${idle} ${idle === 1 ? "needs" : "need"} no heater.` : ""}
      {unknown > 0 ? <b>{` ${unknown} ${isAre(unknown)} not known.`}</b> : null}
    </p>
  );
}
