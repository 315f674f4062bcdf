import { hatch } from "../section-drawing/hatches.tsx";

export interface CapacityPart {
  key: string;
  /** Share of the common scale, 0 to 1. */
  share: number;
  words: string;
  fresh: boolean;
}

interface CapacityBarProps {
  parts: CapacityPart[];
  /** Where the need stands on the same scale. */
  needShare: number;
  /** Spoken in place of the picture. */
  sentence: string;
  /** Words over the missing part, such as "short 19 kW". */
  shortWords?: string;
  height?: number;
  /** About how wide the bar is on a desk, for words that must fit their part. */
  widePx?: number;
}

/** About how wide a bar is on a phone. */
const NARROW_PX = 300;
const LETTER_PX = 8.2;

function wordsFit(part: CapacityPart, barPx: number): boolean {
  return part.share * barPx > part.words.length * LETTER_PX + 20;
}

/** Heaters end to end at one scale, with the need as an upright line and the missing part hatched. */
export function CapacityBar({
  parts,
  needShare,
  sentence,
  shortWords,
  height = 30,
  widePx = 390,
}: CapacityBarProps) {
  const total = parts.reduce((sum, part) => sum + part.share, 0);
  const missing = Math.max(0, needShare - total);
  const at = (share: number) => `${(share * 100).toFixed(2)}%`;
  return (
    <div role="img" aria-label={sentence} className="relative my-2 flex" style={{ height }}>
      {parts.map((part) => (
        <div
          key={part.key}
          style={{ width: at(part.share) }}
          className={`flex items-center overflow-hidden border-[1.5px] border-ink px-2 text-sm font-bold whitespace-nowrap not-first:border-l-0 ${part.fresh ? "bg-bottle-tint" : "bg-trough"}`}
        >
          {wordsFit(part, NARROW_PX) || wordsFit(part, widePx) ? (
            <span
              className={`relative z-1 bg-inherit px-0.5 ${wordsFit(part, NARROW_PX) ? "" : "max-md:hidden"}`}
            >
              {part.words}
            </span>
          ) : null}
        </div>
      ))}
      {missing > 0.002 ? (
        <div style={{ width: at(missing) }} className="relative">
          <svg width="100%" height="100%" aria-hidden="true" className="block">
            <rect
              width="100%"
              height="100%"
              fill={hatch("short")}
              stroke="var(--color-redlead)"
              strokeWidth="2"
            />
          </svg>
        </div>
      ) : null}
      <div
        className="absolute -top-2 -bottom-2 w-[3px] -translate-x-1/2 bg-ink"
        style={{ left: at(needShare) }}
      />
      {shortWords ? (
        <span
          className={`absolute inset-y-0 my-auto h-fit px-1 text-sm leading-tight font-bold text-redlead md:whitespace-nowrap ${needShare < 0.72 ? "" : "bg-sheet"}`}
          style={
            needShare < 0.72
              ? { left: `calc(${at(needShare)} + 6px)`, maxWidth: `calc(${at(1 - needShare)} - 6px)` }
              : { right: `calc(100% - ${at(needShare)} + 8px)` }
          }
        >
          {shortWords}
        </span>
      ) : null}
    </div>
  );
}
