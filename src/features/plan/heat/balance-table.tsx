import { Fragment, useState } from "react";
import type { HouseBalance, PlanResult } from "../../../../server/engine/plan/plan-types.ts";
import { hatch, PathMark } from "../../../components/section-drawing/hatches.tsx";
import {
  flowsOf,
  type HeatPath,
  heatPaths,
  pathsIn,
  pathsOut,
  totalIn,
  totalOut,
} from "../../../components/section-drawing/heat-paths.ts";
import { percent } from "../../../lib/format.ts";
import type { Units } from "../../../lib/units.ts";
import { flowWriter } from "./flow-writer.ts";
import { WhyPart } from "./why-part.tsx";

const LEAST_SHOWN_W = 0.5;

interface BalanceTableProps {
  balance: HouseBalance;
  result: PlanResult;
  units: Units;
}

/** The flows of the chosen hour, going out and coming in. Every amount opens to its parts. */
export function BalanceTable({ balance, result, units }: BalanceTableProps) {
  const [open, setOpen] = useState<HeatPath | null>(null);
  const flows = flowsOf(balance);
  const all = Math.max(totalOut(flows), 1);
  const writer = flowWriter(flows, units);
  const areaM2 = result.geometry.floorAreaM2;
  const flux = (heatW: number) => units.figure(heatW / areaM2, "heatFlux", { decimals: 1 }).value;
  const row = (path: HeatPath) => {
    const opened = open === path;
    const share = flows[path] / all;
    return (
      <Fragment key={path}>
        <tr className="border-b border-rule">
          <th scope="row" className="h-11 py-0 text-left font-normal">
            <button
              type="button"
              aria-expanded={opened}
              onClick={() => setOpen(opened ? null : path)}
              className="flex min-h-11 w-full items-center gap-2 text-left hover:bg-trough"
            >
              <PathMark path={path} />
              <span>
                {heatPaths[path].name}
                <span className="sr-only">
                  {opened ? ", close the parts" : ", show how it is worked out"}
                </span>
              </span>
              <span aria-hidden="true" className="ml-auto text-xs text-bottle underline underline-offset-2">
                {opened ? "close" : "why"}
              </span>
            </button>
          </th>
          <td aria-hidden="true" className="w-[22%] px-2 max-sm:hidden">
            <svg width="100%" height="16" preserveAspectRatio="none" className="block">
              <title>{heatPaths[path].name}</title>
              {share > 0.002 ? (
                <rect
                  x="0.5"
                  y="0.5"
                  width={`${Math.min(99, share * 99)}%`}
                  height="15"
                  fill={hatch(path)}
                  stroke="var(--color-ink)"
                />
              ) : (
                <path d="M1 1V15" stroke="var(--color-ink)" />
              )}
            </svg>
          </td>
          {flows[path] < LEAST_SHOWN_W && heatPaths[path].direction === "in" ? (
            <td colSpan={3} className="text-right text-ink-2">
              none
            </td>
          ) : (
            <>
              <td className="text-right font-bold">{writer.plain(flows[path])}</td>
              <td className="pl-3 text-right">{flux(flows[path])}</td>
              <td className="pl-3 text-right">{percent(share)}</td>
            </>
          )}
        </tr>
        {opened ? (
          <tr className="border-b-2 border-ink bg-trough">
            <td colSpan={5} className="px-3 py-3">
              <WhyPart path={path} balance={balance} result={result} units={units} />
            </td>
          </tr>
        ) : null}
      </Fragment>
    );
  };
  const total = (name: string, amountW: number) => (
    <tr className="border-b-2 border-ink font-bold">
      <th scope="row" className="h-10 text-left">
        {name}
      </th>
      <td aria-hidden="true" className="max-sm:hidden" />
      <td className="text-right">{writer.plain(amountW)}</td>
      <td className="pl-3 text-right">{flux(amountW)}</td>
      <td className="pl-3 text-right">{percent(amountW / all)}</td>
    </tr>
  );
  const head = (name: string) => (
    <tr className="border-b border-ink text-xs text-ink-2">
      <th scope="col" className="py-1 text-left font-semibold">
        {name}
      </th>
      <td aria-hidden="true" className="max-sm:hidden" />
      <th scope="col" className="text-right font-semibold">
        {units.symbol("power")}
      </th>
      <th scope="col" className="pl-3 text-right font-semibold">
        {units.symbol("heatFlux")}
      </th>
      <th scope="col" className="pl-3 text-right font-semibold">
        share
      </th>
    </tr>
  );
  return (
    <table className="w-full border-collapse text-sm">
      <caption className="sr-only">Heat going out and coming in at the chosen hour</caption>
      <thead>{head("Going out")}</thead>
      <tbody>
        {pathsOut.map(row)}
        {total("All losses", totalOut(flows))}
      </tbody>
      <thead>{head("Coming in")}</thead>
      <tbody>
        {pathsIn.map(row)}
        {total("All gains", totalIn(flows))}
      </tbody>
    </table>
  );
}
