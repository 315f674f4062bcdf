import type { HeaterOption } from "../../../server/engine/plan/sizing-types.ts";
import type { Units } from "../../lib/units.ts";
import { CapacityBar } from "../chart/capacity-bar.tsx";

interface OptionBarProps {
  option: Pick<HeaterOption, "units" | "totalW" | "spareW" | "title">;
  needW: number;
  /** Right end of the common scale, W: the same for every option beside it. */
  scaleW: number;
  units: Units;
  height?: number;
  widePx?: number;
}

const NEED_AT_MOST = 0.66;

/** Right end of a scale on which all options and the need have room. */
export function optionScaleW(options: Pick<HeaterOption, "totalW">[], needW: number): number {
  const longest = Math.max(needW, ...options.map((option) => option.totalW)) * 1.04;
  const anyShort = options.some((option) => option.totalW < needW);
  // Words such as "short 19 kW" stand to the right of the need and want room there.
  return anyShort ? Math.max(longest, needW / NEED_AT_MOST) : longest;
}

/** The heaters of one option end to end, against the need. */
export function OptionBar({ option, needW, scaleW, units, height, widePx }: OptionBarProps) {
  const parts = option.units.flatMap((unit, row) =>
    Array.from({ length: Math.min(unit.count, 40) }, (_, i) => ({
      key: `${row}-${i}`,
      share: unit.outputW / scaleW,
      words: `${units.heat(unit.outputW)}${unit.existing ? "" : ", new"}`,
      fresh: !unit.existing,
    })),
  );
  const missing = Math.max(0, needW - option.totalW);
  const verdict =
    missing > 0 ? `short by ${units.heat(missing)}` : `${units.heat(option.totalW - needW)} to spare`;
  return (
    <CapacityBar
      parts={parts}
      needShare={needW / scaleW}
      height={height}
      widePx={widePx}
      shortWords={missing > 0 ? `short ${units.heat(missing)}` : undefined}
      sentence={`${option.title}: ${units.heat(option.totalW)} in all against ${units.heat(needW)} needed, ${verdict}.`}
    />
  );
}
