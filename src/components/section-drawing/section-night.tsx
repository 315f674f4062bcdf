import type { UnitSystem } from "../../../server/engine/units.ts";
import { roundTemperature, temperature } from "../../lib/format.ts";
import { frameFor, px } from "./frame.ts";
import { Plate } from "./heat-label.tsx";
import { ScaleBar } from "./scale-bar.tsx";
import type { SectionShape } from "./section-shape.ts";
import { SectionShell, type Shell } from "./shell.tsx";

interface SectionNightProps {
  shape: SectionShape;
  shell: Shell;
  system: UnitSystem;
  outsideC: number;
  insideC: number;
  /** The house does not keep what is wanted. */
  cold: boolean;
}

const fit = {
  width: 430,
  height: 280,
  widthShare: 0.74,
  heightShare: 0.6,
  centreShare: 0.5,
  groundShare: 0.8,
};

/** The house on its coldest night: outside, and where the inside would come to rest. */
export function SectionNight({ shape, shell, system, outsideC, insideC, cold }: SectionNightProps) {
  const frame = frameFor(shape, fit);
  const outside = temperature(outsideC, system);
  const inside = roundTemperature(insideC, system);
  const words = cold ? "would fall to" : "stays at";
  const x = frame.x(0);
  const y = Math.min(frame.groundY - 40, frame.y(shape.topM * 0.55));
  const edge = cold ? "var(--color-redlead)" : "var(--color-ink)";
  return (
    <svg
      viewBox={`0 0 ${fit.width} ${fit.height}`}
      role="img"
      aria-label={`Section through the house on the coldest night. Outside ${outside}; inside ${words} ${inside}.`}
      className="block h-auto w-full"
    >
      <SectionShell shape={shape} shell={shell} frame={frame} />
      <Plate name="Outside" value={outside} x={14} y={24} fontSize={15} />
      <rect
        x={px(x - 62)}
        y={px(y - 24)}
        width="124"
        height="52"
        fill="var(--color-sheet)"
        stroke={edge}
        strokeWidth="2"
      />
      <text x={px(x)} y={px(y - 6)} fontSize="14" textAnchor="middle" fill="var(--color-ink-2)">
        {words}
      </text>
      <text x={px(x)} y={px(y + 18)} fontSize="20" fontWeight="700" textAnchor="middle" fill={edge}>
        {inside}
      </text>
      <ScaleBar frame={frame} system={system} x={14} y={fit.height - 14} />
    </svg>
  );
}
