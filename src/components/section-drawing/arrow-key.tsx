import { displayUnit, fromSi, toSi, type UnitSystem } from "../../../server/engine/units.ts";
import { text } from "../../lib/format.ts";
import { px } from "./frame.ts";

const roundAmounts = [1, 2, 5, 10, 20, 50, 100, 200, 500, 1000, 2000, 5000, 10_000];

/** The largest round amount of heat whose arrow stays narrower than half the widest one. */
function keyAmountW(greatestFlowW: number, system: UnitSystem): number {
  const unit = displayUnit("power", system);
  const most = fromSi(greatestFlowW, unit) * 0.4;
  const amount = roundAmounts.filter((value) => value <= most).at(-1) ?? roundAmounts[0] ?? 1;
  return toSi(amount, unit);
}

interface ArrowKeyProps {
  widthPerW: number;
  greatestFlowW: number;
  system: UnitSystem;
  x: number;
  y: number;
}

/** Says how much heat an arrow of a drawn width carries. */
export function ArrowKey({ widthPerW, greatestFlowW, system, x, y }: ArrowKeyProps) {
  const amountW = keyAmountW(greatestFlowW, system);
  const width = amountW * widthPerW;
  return (
    <g>
      <rect
        x={x}
        y={px(y - width / 2)}
        width="26"
        height={px(width)}
        fill="none"
        stroke="var(--color-ink)"
        strokeWidth="1.2"
      />
      <text x={x + 33} y={y + 5} fontSize="12.5" fill="var(--color-ink-2)">
        {`this wide: ${text(amountW, "power", system, { decimals: 0 })}`}
      </text>
    </g>
  );
}
