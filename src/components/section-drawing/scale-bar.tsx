import { toSi, type UnitSystem } from "../../../server/engine/units.ts";
import { number, unitSymbol } from "../../lib/format.ts";
import { type Frame, px } from "./frame.ts";

const roundLengths = [1, 2, 5, 10, 15, 20, 50, 100];
const LEAST_BAR_PX = 50;

/** A ruled bar of a round length in the reader's unit. */
export function ScaleBar({
  frame,
  system,
  x,
  y,
}: {
  frame: Frame;
  system: UnitSystem;
  x: number;
  y: number;
}) {
  const lengthOf = (value: number) => toSi(value, system === "us" ? "ft" : "m") * frame.scale;
  const round = roundLengths.find((value) => lengthOf(value) >= LEAST_BAR_PX) ?? 200;
  const width = lengthOf(round);
  return (
    <g>
      <path
        d={`M${px(x)} ${y - 8}v8h${px(width)}v-8`}
        fill="none"
        stroke="var(--color-ink)"
        strokeWidth="1.5"
      />
      <rect x={x} y={y - 5} width={width / 2} height="5" fill="var(--color-ink)" />
      <text x={x + width + 8} y={y + 1} fontSize="12.5" fill="var(--color-ink-2)">
        {number(round)} {unitSymbol("length", system)}
      </text>
    </g>
  );
}
