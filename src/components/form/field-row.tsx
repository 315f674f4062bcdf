import type { ReactNode } from "react";

interface FieldRowProps {
  label: ReactNode;
  hint?: ReactNode;
  /** A sentence; its line is kept free so that nothing jumps when it appears. */
  error?: string;
  errorId: string;
  hintId: string;
  control: ReactNode;
  origin?: ReactNode;
  active?: boolean;
}

/** One question: words at the left, the control, and where the answer came from. */
export function FieldRow({ label, hint, error, errorId, hintId, control, origin, active }: FieldRowProps) {
  const rows = hint ? "md:row-span-2" : "";
  return (
    <div className="grid grid-cols-[minmax(0,1fr)_216px] items-center gap-x-3 border-b border-rule px-4 pt-1.5 md:grid-cols-[minmax(0,1fr)_250px_112px] md:px-0">
      <div className={`${active ? "font-bold" : ""} ${hint ? "md:self-end" : ""}`}>{label}</div>
      <div className={`max-md:row-span-2 ${rows}`}>{control}</div>
      <div className={`max-md:col-start-1 max-md:row-start-2 max-md:-ml-1 ${rows}`}>{origin}</div>
      {hint ? (
        <div
          id={hintId}
          className="text-xs text-ink-2 max-md:col-span-full md:col-start-1 md:row-start-2 md:self-start"
        >
          {hint}
        </div>
      ) : null}
      <p
        id={errorId}
        aria-live="polite"
        className="col-span-full m-0 min-h-[14px] pb-0.5 text-right text-xs leading-[14px] font-medium text-redlead md:pr-[124px]"
      >
        {error ?? ""}
      </p>
    </div>
  );
}
