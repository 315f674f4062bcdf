import {
  Area,
  CartesianGrid,
  ComposedChart,
  ReferenceLine,
  ResponsiveContainer,
  XAxis,
  YAxis,
} from "recharts";
import { number } from "../../lib/format.ts";
import { LineWords } from "./line-words.tsx";
import { axisStep, axisTicks, niceTop } from "./nice-top.ts";

interface DayCurveProps {
  /** Mean heater output in each hour of the day, reader's unit. */
  hours: number[];
  installed: number;
  installedWords: string;
  height?: number;
}

/** Heater output through the 24 hours of a normal day, as steps. */
export function DayCurve({ hours, installed, installedWords, height = 150 }: DayCurveProps) {
  const rows = [...hours, hours.at(-1) ?? 0].map((heat, hour) => ({ hour, heat }));
  const greatest = Math.max(...hours, installed > 0 ? Math.min(installed, Math.max(...hours) * 3) : 0);
  const top = niceTop(greatest);
  const step = axisStep(top * 1.5);
  const ticks = axisTicks(0, Math.ceil(top / step) * step, step);
  const last = ticks.at(-1) ?? top;
  return (
    <ResponsiveContainer width="100%" height={height}>
      <ComposedChart data={rows} margin={{ top: 8, right: 6, bottom: 0, left: 0 }} accessibilityLayer={false}>
        <CartesianGrid vertical={false} stroke="var(--color-rule)" />
        <XAxis
          dataKey="hour"
          type="number"
          domain={[0, 24]}
          ticks={[0, 3, 6, 9, 12, 15, 18, 21, 24]}
          tickFormatter={(hour: number) => String(hour).padStart(2, "0")}
          tickLine={false}
          axisLine={{ stroke: "var(--color-rule-strong)" }}
          tick={{ fill: "var(--color-ink)", fontSize: 13 }}
        />
        <YAxis
          width={48}
          domain={[0, last]}
          ticks={ticks}
          tickLine={false}
          axisLine={false}
          tick={{ fill: "var(--color-ink)", fontSize: 13 }}
          tickFormatter={(value: number) => number(value, step < 1 ? 1 : 0)}
        />
        <Area
          type="stepAfter"
          dataKey="heat"
          stroke="var(--color-path-heater)"
          strokeWidth={2.4}
          fill="var(--color-path-heater)"
          fillOpacity={0.22}
          isAnimationActive={false}
          activeDot={false}
        />
        {installed > 0 && installed <= last ? (
          <ReferenceLine
            y={installed}
            stroke="var(--color-ink)"
            strokeDasharray="6 4"
            label={{
              content: ({ viewBox }) => (
                <LineWords viewBox={viewBox} label={installedWords} colour="var(--color-ink)" at={0.5} />
              ),
            }}
          />
        ) : null}
      </ComposedChart>
    </ResponsiveContainer>
  );
}
