import type { MonthResult, PlanResult } from "../../../../server/engine/plan/plan-types.ts";
import { ChartFrame } from "../../../components/chart/chart-frame.tsx";
import type { FigureColumn } from "../../../components/chart/figure-table.tsx";
import { FigureTable } from "../../../components/chart/figure-table.tsx";
import { MonthsStack } from "../../../components/chart/months-stack.tsx";
import { rarity } from "../../../components/plan/state-words.ts";
import { type HeatPath, heatPaths } from "../../../components/section-drawing/heat-paths.ts";
import { monthAbbreviation, number } from "../../../lib/format.ts";
import type { Units } from "../../../lib/units.ts";

interface YearRow {
  name: string;
  kwh: Record<HeatPath, number>;
  ventedKwh: number;
  unmetKwh: number;
  peakW: number;
  designC: number | null;
  nightC: number | null;
}

const outOrder: HeatPath[] = ["cover", "sky", "air", "ground"];
const inOrder: HeatPath[] = ["sun", "stock", "lights", "heater"];
const order = [...outOrder, ...inOrder];

function yearRow(month: MonthResult): YearRow {
  const { energy } = month;
  return {
    name: monthAbbreviation(month.month),
    kwh: { ...energy.lossesKwh, ...energy.gainsKwh, heater: energy.heaterKwh },
    ventedKwh: energy.ventedSurplusKwh,
    unmetKwh: energy.unmetKwh,
    peakW: month.onceInYearsRequiredW,
    designC: month.climate.onceInYearsDesignC,
    nightC: month.occupied ? month.setpointNightC : null,
  };
}

function yearTotal(rows: YearRow[]): YearRow {
  const sum = (pick: (row: YearRow) => number) => rows.reduce((total, row) => total + pick(row), 0);
  return {
    name: "Year",
    kwh: Object.fromEntries(order.map((path) => [path, sum((row) => row.kwh[path])])) as YearRow["kwh"],
    ventedKwh: sum((row) => row.ventedKwh),
    unmetKwh: sum((row) => row.unmetKwh),
    peakW: Math.max(...rows.map((row) => row.peakW)),
    designC: Math.min(...rows.map((row) => row.designC ?? Number.POSITIVE_INFINITY)),
    nightC: null,
  };
}

function yearColumns(units: Units, result: PlanResult): FigureColumn<YearRow>[] {
  const greatest = units.amount(Math.max(...result.months.map((m) => m.energy.heaterKwh)), "energy");
  const decimals = greatest < 100 ? 1 : 0;
  const energy = (id: string, header: string, pick: (row: YearRow) => number): FigureColumn<YearRow> => ({
    id,
    header,
    unit: units.symbol("energy"),
    cell: (row) => number(units.amount(pick(row), "energy"), decimals),
    plain: (row) => units.amount(pick(row), "energy").toFixed(2),
  });
  const anyUnmet = result.months.some((month) => month.energy.unmetKwh > 0.5);
  return [
    { id: "month", header: "Month", names: true, cell: (row) => row.name, plain: (row) => row.name },
    {
      id: "night",
      header: "Night wanted",
      unit: units.symbol("temperature"),
      cell: (row) => units.figure(row.nightC, "temperature").value,
      plain: (row) => (row.nightC === null ? "" : units.amount(row.nightC, "temperature")),
    },
    {
      id: "design",
      header: `Outside, ${rarity(result.returnPeriodYears)}`,
      unit: units.symbol("temperature"),
      cell: (row) => units.figure(row.designC, "temperature").value,
      plain: (row) => units.amount(row.designC ?? Number.NaN, "temperature"),
    },
    {
      id: "peak",
      header: "Peak need",
      unit: units.symbol("power"),
      cell: (row) => <b>{units.figure(row.peakW, "power").value}</b>,
      plain: (row) => units.amount(row.peakW, "power"),
    },
    ...outOrder.map((path) => energy(path, heatPaths[path].name, (row) => row.kwh[path])),
    ...inOrder
      .filter(
        (path) =>
          path !== "heater" &&
          result.months.some((m) => (m.energy.gainsKwh as Record<string, number>)[path] !== 0),
      )
      .map((path) => energy(path, heatPaths[path].name, (row) => row.kwh[path])),
    energy("heater", heatPaths.heater.name, (row) => row.kwh.heater),
    ...(anyUnmet ? [energy("unmet", "Heat missing", (row) => row.unmetKwh)] : []),
  ];
}

/** The heat of a normal year by month and path, as chart and as table. */
export function YearChart({
  result,
  units,
  fileName,
}: {
  result: PlanResult;
  units: Units;
  fileName: string;
}) {
  const rows = result.months.map(yearRow);
  const total = yearTotal(rows);
  const worst = rows.reduce((a, b) => (b.kwh.heater > a.kwh.heater ? b : a), rows[0] ?? total);
  const shown = order.filter((path) => total.kwh[path] > 0.5);
  return (
    <ChartFrame
      title="Heat through a normal year"
      aside="above the line: going out. Below: coming in."
      unit={units.symbol("energy")}
      sentence={`The heaters give ${units.energy(total.kwh.heater)} in the year, most in ${worst.name} with ${units.energy(worst.kwh.heater)}.`}
      columns={yearColumns(units, result)}
      rows={rows}
      rowKey={(row) => row.name}
      foot={total}
      fileName={fileName}
    >
      <MonthsStack
        paths={shown}
        months={rows.map((row) => ({
          name: row.name,
          amounts: Object.fromEntries(shown.map((path) => [path, units.amount(row.kwh[path], "energy")])),
        }))}
      />
    </ChartFrame>
  );
}

/** Month by month: temperatures, peak, losses, gains and heater heat, with the year's sum. */
export function YearTable({ result, units }: { result: PlanResult; units: Units }) {
  const rows = result.months.map(yearRow);
  return (
    <FigureTable
      caption="Month by month"
      columns={yearColumns(units, result)}
      rows={rows}
      rowKey={(row) => row.name}
      foot={yearTotal(rows)}
    />
  );
}
