import type { Origin } from "../../../server/contracts/quantity.ts";
import { originWords } from "./origin-words.ts";

/** Filled: seen with own eyes. Half filled: told. Empty: assumed. The word stands beside it. */
export function OriginGlyph({ origin }: { origin: Origin }) {
  const { strength } = originWords[origin];
  return (
    <svg width="15" height="15" aria-hidden="true" focusable="false" className="flex-none self-center">
      <rect
        x="1"
        y="1"
        width="13"
        height="13"
        fill={strength === "known" ? "var(--color-ink)" : "var(--color-sheet)"}
        stroke="var(--color-ink)"
        strokeWidth="1.5"
      />
      {strength === "told" ? <path d="M1 1H14L1 14Z" fill="var(--color-ink)" /> : null}
    </svg>
  );
}
