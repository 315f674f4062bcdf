import type { VerdictKind } from "./verdict.ts";

/** Shape, colour and a sign; the words stand beside it. */
export function VerdictMark({ kind, size = 22 }: { kind: VerdictKind; size?: number }) {
  return (
    <svg width={size} height={size} viewBox="0 0 24 24" aria-hidden="true" className="flex-none">
      {kind === "short" ? (
        <>
          <circle
            cx="12"
            cy="12"
            r="11"
            fill="var(--color-redlead)"
            stroke="var(--color-ink)"
            strokeWidth="1.1"
          />
          <path d="M12 5.5v8M12 16.5v2" stroke="var(--color-on-redlead)" strokeWidth="2.6" />
        </>
      ) : null}
      {kind === "tight" ? (
        <path
          d="M12 1.5 22.5 12 12 22.5 1.5 12Z"
          fill="var(--color-straw)"
          stroke="#14211f"
          strokeWidth="1.2"
        />
      ) : null}
      {kind === "unfinished" ? (
        <>
          <circle
            cx="12"
            cy="12"
            r="10.5"
            fill="none"
            stroke="var(--color-ink)"
            strokeWidth="1.6"
            strokeDasharray="3 2.4"
          />
          <path
            d="M9 9.3c.3-4 6.4-3.600 6 .2-.3 2-3 2.200-3 4.300M12 16.300v2"
            fill="none"
            stroke="var(--color-ink)"
            strokeWidth="1.9"
          />
        </>
      ) : null}
      {kind === "holds" ? (
        <path d="M4.500 12.500 10 18 20 6" fill="none" stroke="var(--color-ink)" strokeWidth="2.2" />
      ) : null}
      {kind === "notApplicable" ? <path d="M5 12h14" stroke="var(--color-ink)" strokeWidth="2.2" /> : null}
    </svg>
  );
}
