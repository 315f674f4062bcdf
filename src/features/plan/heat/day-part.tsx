import type { MonthResult, PlanResult } from "../../../../server/engine/plan/plan-types.ts";
import { ChartFrame } from "../../../components/chart/chart-frame.tsx";
import { DayCurve } from "../../../components/chart/day-curve.tsx";
import { monthName } from "../../../lib/format.ts";
import type { Units } from "../../../lib/units.ts";

interface DayPartProps {
  month: MonthResult;
  result: PlanResult;
  units: Units;
  fileName: string;
}

interface HourRow {
  hour: number;
  heatW: number;
  outdoorC: number | undefined;
}

/** A normal day of the chosen month, hour by hour. */
export function DayPart({ month, result, units, fileName }: DayPartProps) {
  const rows: HourRow[] = month.energy.heaterByHourW.map((heatW, hour) => ({
    hour,
    heatW,
    outdoorC: month.energy.outdoorByHourC[hour],
  }));
  const most = rows.reduce<HourRow | undefined>((a, b) => (a && a.heatW >= b.heatW ? a : b), undefined);
  const clock = (hour: number) => `${String(hour).padStart(2, "0")}:00`;
  return (
    <ChartFrame
      title={`A normal day in ${monthName(month.month)}`}
      aside="mean heater output by the hour, sun time"
      unit={units.symbol("power")}
      sentence={
        most ? `Most heat is given at ${clock(most.hour)}: ${units.text(most.heatW, "power")}.` : "No heat."
      }
      columns={[
        {
          id: "hour",
          header: "Hour",
          names: true,
          cell: (row) => clock(row.hour),
          plain: (row) => clock(row.hour),
        },
        {
          id: "heat",
          header: "Heater output",
          unit: units.symbol("power"),
          cell: (row) => units.figure(row.heatW, "power").value,
          plain: (row) => units.amount(row.heatW, "power").toFixed(2),
        },
        {
          id: "outdoor",
          header: "Outside air",
          unit: units.symbol("temperature"),
          cell: (row) => units.figure(row.outdoorC, "temperature").value,
          plain: (row) => units.amount(row.outdoorC ?? Number.NaN, "temperature").toFixed(1),
        },
      ]}
      rows={rows}
      rowKey={(row) => String(row.hour)}
      fileName={fileName}
    >
      <DayCurve
        hours={rows.map((row) => units.amount(row.heatW, "power"))}
        installed={units.amount(result.sizing.installedW, "power")}
        installedWords={`Fitted: ${units.heat(result.sizing.installedW)}`}
      />
    </ChartFrame>
  );
}
