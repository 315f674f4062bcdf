import {
  Area,
  CartesianGrid,
  ComposedChart,
  Line,
  ReferenceDot,
  ReferenceLine,
  ResponsiveContainer,
  XAxis,
  YAxis,
} from "recharts";
import { monthShort, number } from "../../lib/format.ts";
import { hatch } from "../section-drawing/hatches.tsx";
import { LineWords } from "./line-words.tsx";
import { niceTop } from "./nice-top.ts";

export interface NeedSteps {
  /** Need of each month on the rarer night and on the everyday night, in the reader's unit. */
  onceInYears: number[];
  everyday: number[];
  installed: number;
  proposed: number | null;
}

interface NeedStepsProps {
  data: NeedSteps;
  unit: string;
  installedWords: string;
  proposedWords: string | null;
  height?: number;
  /** The missing part is hatched; left out for houses that are not meant to be heated. */
  withShort?: boolean;
  /** Drawn at a fixed width instead of the room there is; paper has no room to measure. */
  width?: number;
}

const LETTER_PX = 7.6;
const NARROW_MONTH_PX = 22;

const words = { fill: "var(--color-ink)", fontSize: 13, fontWeight: 650 };

/** Place of the month in the middle of those that ask for least. */
function lowestMonth(needs: number[]): number {
  const least = Math.min(...needs);
  const low = [...needs.keys()].filter((i) => (needs[i] ?? 0) <= least * 1.05 + 1e-9);
  return low[Math.floor(low.length / 2)] ?? 0;
}

/** Month by month, what the cold night asks for against what is fitted. The missing part is hatched. */
export function NeedStepsChart(props: NeedStepsProps) {
  const { data, unit, installedWords, proposedWords, height = 330, width, withShort = true } = props;
  const { onceInYears, everyday, installed, proposed } = data;
  const edges = [...onceInYears.keys(), onceInYears.length];
  const rows = edges.map((edge) => {
    const need = onceInYears[Math.min(edge, 11)] ?? 0;
    return {
      edge,
      need,
      everyday: everyday[Math.min(edge, 11)] ?? 0,
      short: need > installed ? [installed, need] : [installed, installed],
    };
  });
  const top = niceTop(Math.max(...onceInYears, ...everyday, installed, proposed ?? 0));
  const worst = onceInYears.indexOf(Math.max(...onceInYears));
  const worstShort = withShort ? (onceInYears[worst] ?? 0) - installed : 0;
  const decimals = top < 20 ? 1 : 0;
  // Long numbers do not fit the narrow months of a phone or a printed sheet; every second one does, the worst among them.
  const longest = Math.max(...onceInYears.map((need) => number(need, decimals).length));
  const crowded = longest * LETTER_PX > NARROW_MONTH_PX;
  // The month that asks for least leaves the most room for words.
  const wordsAt = (lowestMonth(onceInYears) + 0.5) / 12;
  const chart = (
    <ComposedChart
      {...(width === undefined ? {} : { width, height })}
      data={rows}
      margin={{ top: 12, right: 6, bottom: 0, left: 0 }}
      accessibilityLayer={false}
    >
      <CartesianGrid vertical={false} stroke="var(--color-rule)" />
      <XAxis
        dataKey="edge"
        type="number"
        domain={[0, 12]}
        ticks={monthShort.map((_, i) => i + 0.5)}
        tickFormatter={(value: number) => monthShort[Math.floor(value)] ?? ""}
        tickLine={false}
        axisLine={{ stroke: "var(--color-rule-strong)" }}
        tick={{ fill: "var(--color-ink)", fontSize: 13 }}
        interval="preserveStartEnd"
      />
      <YAxis
        width={52}
        domain={[0, top]}
        tickCount={6}
        tickLine={false}
        axisLine={false}
        tick={{ fill: "var(--color-ink)", fontSize: 13 }}
        tickFormatter={(value: number) => number(value, top < 5 ? 1 : 0)}
      />
      <Area
        type="stepAfter"
        dataKey="need"
        stroke="none"
        fill="var(--color-trough)"
        fillOpacity={1}
        isAnimationActive={false}
        activeDot={false}
      />
      {worstShort > 0 ? (
        <Area
          type="stepAfter"
          dataKey="short"
          stroke="none"
          fill={hatch("short")}
          fillOpacity={1}
          isAnimationActive={false}
          activeDot={false}
        />
      ) : null}
      <Line
        type="stepAfter"
        dataKey="everyday"
        stroke="var(--color-ink-2)"
        strokeWidth={1.6}
        strokeDasharray="2 3"
        dot={false}
        isAnimationActive={false}
        activeDot={false}
      />
      <Line
        type="stepAfter"
        dataKey="need"
        stroke="var(--color-ink)"
        strokeWidth={2.6}
        dot={false}
        isAnimationActive={false}
        activeDot={false}
      />
      {installed > 0 ? (
        <ReferenceLine
          y={installed}
          stroke="var(--color-redlead)"
          strokeWidth={2}
          strokeDasharray="8 4"
          label={{
            content: ({ viewBox }) => (
              <LineWords
                viewBox={viewBox}
                label={installedWords}
                colour="var(--color-redlead)"
                at={wordsAt}
              />
            ),
          }}
        />
      ) : null}
      {proposed !== null && proposedWords ? (
        <ReferenceLine
          y={proposed}
          stroke="var(--color-bottle)"
          strokeWidth={2.6}
          label={{
            content: ({ viewBox }) => (
              <LineWords viewBox={viewBox} label={proposedWords} colour="var(--color-bottle)" at={wordsAt} />
            ),
          }}
        />
      ) : null}
      {onceInYears.map((need, month) => (
        <ReferenceDot
          key={monthShort[month]}
          x={month + 0.5}
          y={need}
          r={0}
          label={{
            value: need > 0 ? number(need, decimals) : "\u2013",
            position: "top",
            className:
              crowded && (month - worst) % 2 !== 0
                ? width === undefined
                  ? "max-sm:hidden"
                  : "hidden"
                : undefined,
            ...words,
          }}
        />
      ))}
      {worstShort > 0 && installed > 0 ? (
        <ReferenceDot
          x={worst + 0.5}
          y={installed + worstShort / 2}
          r={0}
          label={{
            content: ({ viewBox }) => (
              <ShortPlate viewBox={viewBox} label={`${number(worstShort, decimals)} ${unit}`} />
            ),
          }}
        />
      ) : null}
    </ComposedChart>
  );
  return width === undefined ? (
    <ResponsiveContainer width="100%" height={height}>
      {chart}
    </ResponsiveContainer>
  ) : (
    chart
  );
}

/** The worst shortfall, written on its own plate inside the hatching. */
function ShortPlate({ viewBox, label }: { viewBox?: unknown; label: string }) {
  const place = viewBox as { x?: number; y?: number } | undefined;
  if (place?.x === undefined || place.y === undefined) return null;
  const width = label.length * 8 + 8;
  const x = Math.max(place.x, 56 + width / 2);
  return (
    <g>
      <rect x={x - width / 2} y={place.y - 12} width={width} height="24" fill="var(--color-sheet)" />
      <text
        x={x}
        y={place.y + 5}
        textAnchor="middle"
        fontSize="14"
        fontWeight="700"
        fill="var(--color-redlead)"
      >
        {label}
      </text>
    </g>
  );
}
