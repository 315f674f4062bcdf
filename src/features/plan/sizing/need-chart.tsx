import type { MonthResult, PlanResult } from "../../../../server/engine/plan/plan-types.ts";
import type { HeaterOption } from "../../../../server/engine/plan/sizing-types.ts";
import { ChartFrame } from "../../../components/chart/chart-frame.tsx";
import type { FigureColumn } from "../../../components/chart/figure-table.tsx";
import { NeedStepsChart } from "../../../components/chart/need-steps.tsx";
import { rarity } from "../../../components/plan/state-words.ts";
import { hatch } from "../../../components/section-drawing/hatches.tsx";
import { counted, monthAbbreviation, monthName } from "../../../lib/format.ts";
import type { Units } from "../../../lib/units.ts";

interface NeedChartProps {
  result: PlanResult;
  chosen: HeaterOption | null;
  units: Units;
  fileName: string;
}

function columns(result: PlanResult, units: Units): FigureColumn<MonthResult>[] {
  const power = (
    id: string,
    header: string,
    pick: (row: MonthResult) => number,
  ): FigureColumn<MonthResult> => ({
    id,
    header,
    unit: units.symbol("power"),
    cell: (row) => units.figure(pick(row), "power").value,
    plain: (row) => units.amount(pick(row), "power").toFixed(2),
  });
  const installedW = result.sizing.installedW;
  return [
    {
      id: "month",
      header: "Month",
      names: true,
      cell: (row) => monthName(row.month),
      plain: (row) => monthName(row.month),
    },
    power("everyday", "Ordinary cold night", (row) => row.everydayRequiredW),
    power("rare", `Coldest night ${rarity(result.returnPeriodYears)}`, (row) => row.onceInYearsRequiredW),
    power("installed", "Fitted now", () => installedW),
    power("short", "Short", (row) => Math.max(0, row.onceInYearsRequiredW - installedW)),
  ];
}

/** Need against fitted heat by month, the missing part hatched and the worst of it written. */
export function NeedChart({ result, chosen, units, fileName }: NeedChartProps) {
  const { installedW } = result.sizing;
  const shortMonths = result.months.filter((month) => month.onceInYearsRequiredW > installedW + 1);
  const worst = result.months.reduce<MonthResult | undefined>(
    (a, b) => (a && a.onceInYearsRequiredW >= b.onceInYearsRequiredW ? a : b),
    undefined,
  );
  const worstShortW = (worst?.onceInYearsRequiredW ?? 0) - installedW;
  const unheated = result.sizing.noHeaterReason !== null;
  const shortWords = unheated
    ? "kept without heat"
    : shortMonths.length > 0 && worst
      ? `short in ${counted(shortMonths.length, "month")}, worst ${units.heat(worstShortW)} in ${monthAbbreviation(worst.month)}`
      : "enough in every month";
  return (
    <ChartFrame
      title={
        unheated
          ? "What keeping the wanted temperature would take"
          : "Heat needed on the coldest night of each month"
      }
      aside={
        <span className="inline-flex flex-wrap items-center gap-x-4 gap-y-1">
          <span className="inline-flex items-center gap-2">
            <svg width="26" height="12" aria-hidden="true">
              <path d="M0 6H26" stroke="var(--color-ink)" strokeWidth="2.6" />
            </svg>
            {rarity(result.returnPeriodYears)}
          </span>
          <span className="inline-flex items-center gap-2">
            <svg width="26" height="12" aria-hidden="true">
              <path d="M0 6H26" stroke="var(--color-ink-2)" strokeWidth="1.6" strokeDasharray="2 3" />
            </svg>
            ordinary cold night
          </span>
          <span className="inline-flex items-center gap-2">
            {shortMonths.length > 0 && !unheated ? (
              <svg width="26" height="14" aria-hidden="true">
                <rect width="26" height="14" fill={hatch("short")} stroke="var(--color-redlead)" />
              </svg>
            ) : null}
            {shortWords}
          </span>
        </span>
      }
      unit={units.symbol("power")}
      sentence={
        installedW > 0
          ? `${units.heat(installedW)} is fitted: ${shortWords}.`
          : `No heater is fitted: ${shortWords}.`
      }
      columns={columns(result, units)}
      rows={result.months}
      rowKey={(row) => String(row.month)}
      fileName={fileName}
    >
      <NeedStepsChart
        unit={units.symbol("power")}
        withShort={!unheated}
        installedWords={`Fitted now: ${units.heat(installedW)}`}
        proposedWords={chosen ? `Chosen: ${units.heat(chosen.totalW)}` : null}
        data={{
          onceInYears: result.months.map((month) => units.amount(month.onceInYearsRequiredW, "power")),
          everyday: result.months.map((month) => units.amount(month.everydayRequiredW, "power")),
          installed: units.amount(installedW, "power"),
          proposed:
            chosen && Math.abs(chosen.totalW - installedW) > 1 ? units.amount(chosen.totalW, "power") : null,
        }}
      />
    </ChartFrame>
  );
}
