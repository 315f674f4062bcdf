import { Bar, BarChart, CartesianGrid, ResponsiveContainer, XAxis, YAxis } from "recharts";
import { number } from "../../lib/format.ts";
import { hatch, PathMark } from "../section-drawing/hatches.tsx";
import { type HeatPath, heatPaths } from "../section-drawing/heat-paths.ts";
import { axisStep, axisTicks } from "./nice-top.ts";

export interface MonthStack {
  name: string;
  /** Amounts in the reader's unit; gains are drawn below the line. */
  amounts: Partial<Record<HeatPath, number>>;
}

interface MonthsStackProps {
  months: MonthStack[];
  paths: HeatPath[];
  height?: number;
}

/** A legend of our own: the fixed order is the meaning, and a chart library may sort its own. */
function LegendRow({ paths }: { paths: HeatPath[] }) {
  return (
    <ul className="m-0 flex list-none flex-wrap gap-x-5 gap-y-1 p-0 text-xs text-ink">
      {paths.map((path) => (
        <li key={path} className="inline-flex items-center gap-1.5">
          <PathMark path={path} size={14} />
          {heatPaths[path].name}
        </li>
      ))}
    </ul>
  );
}

function sumOf(month: MonthStack, paths: HeatPath[], side: "out" | "in"): number {
  return paths
    .filter((path) => (heatPaths[path].direction === "out") === (side === "out"))
    .reduce((sum, path) => sum + (month.amounts[path] ?? 0), 0);
}

/** Twelve months, losses upwards and gains downwards, each path with its own hatch in a fixed order. */
export function MonthsStack({ months, paths, height = 300 }: MonthsStackProps) {
  const rows = months.map((month) => ({
    name: month.name,
    ...Object.fromEntries(
      paths.map((path) => {
        const amount = month.amounts[path] ?? 0;
        return [path, heatPaths[path].direction === "out" ? amount : -amount];
      }),
    ),
  }));
  const top = Math.max(...months.map((month) => sumOf(month, paths, "out")));
  const bottom = Math.max(...months.map((month) => sumOf(month, paths, "in")));
  const step = axisStep(top + bottom);
  const ticks = axisTicks(-Math.ceil(bottom / step) * step, Math.ceil(top / step) * step, step);
  return (
    <>
      <LegendRow paths={paths} />
      <ResponsiveContainer width="100%" height={height}>
        <BarChart
          data={rows}
          stackOffset="sign"
          margin={{ top: 6, right: 4, bottom: 0, left: 0 }}
          accessibilityLayer={false}
        >
          <CartesianGrid vertical={false} stroke="var(--color-rule)" />
          <XAxis
            dataKey="name"
            tickLine={false}
            axisLine={{ stroke: "var(--color-rule-strong)" }}
            tick={{ fill: "var(--color-ink)", fontSize: 13 }}
            interval="preserveStartEnd"
          />
          <YAxis
            width={56}
            ticks={ticks}
            domain={[ticks[0] ?? 0, ticks.at(-1) ?? 1]}
            tickLine={false}
            axisLine={false}
            tick={{ fill: "var(--color-ink)", fontSize: 13 }}
            tickFormatter={(value: number) => number(Math.abs(value))}
          />
          {paths.map((path) => (
            <Bar
              key={path}
              dataKey={path}
              stackId="heat"
              fill={hatch(path)}
              stroke="var(--color-ink)"
              strokeWidth={1.1}
              isAnimationActive={false}
            />
          ))}
        </BarChart>
      </ResponsiveContainer>
    </>
  );
}
