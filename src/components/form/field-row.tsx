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
  return (
    <div className="grid grid-cols-[minmax(0,1fr)_216px] items-center gap-x-3 border-b border-rule px-4 pt-1.5 md:grid-cols-[minmax(0,1fr)_250px_112px] md:px-0">
      <div className={active ? "font-bold" : ""}>
        {label}
        {hint ? (
          <span id={hintId} className="block text-xs font-normal text-ink-2">
            {hint}
          </span>
        ) : null}
      </div>
      <div className="max-md:row-span-2">{control}</div>
      <div className="max-md:col-start-1 max-md:row-start-2 max-md:-ml-1">{origin}</div>
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
