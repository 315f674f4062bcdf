import { Minus, Plus } from "lucide-react";
import { useEffect, useRef } from "react";

interface HoldButtonProps {
  direction: 1 | -1;
  label: string;
  onStep: () => void;
  disabled?: boolean;
}

const FIRST_REPEAT_MS = 420;
const REPEAT_MS = 90;

/** Plus or minus. Holding it down repeats, so that a gloved thumb need not tap forty times. */
export function HoldButton({ direction, label, onStep, disabled }: HoldButtonProps) {
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  const latest = useRef(onStep);
  useEffect(() => {
    latest.current = onStep;
  });
  useEffect(() => () => clearTimeout(timer.current), []);
  const repeated = useRef(false);
  const repeat = (wait: number) => {
    timer.current = setTimeout(() => {
      repeated.current = true;
      latest.current();
      repeat(REPEAT_MS);
    }, wait);
  };
  const Icon = direction === 1 ? Plus : Minus;
  return (
    <button
      type="button"
      aria-label={label}
      disabled={disabled}
      onPointerDown={(event) => {
        if (event.button !== 0) return;
        repeated.current = false;
        repeat(FIRST_REPEAT_MS);
      }}
      onPointerUp={() => clearTimeout(timer.current)}
      onPointerLeave={() => clearTimeout(timer.current)}
      onPointerCancel={() => clearTimeout(timer.current)}
      onContextMenu={(event) => event.preventDefault()}
      onClick={() => {
        // Stepping on release lets a scroll that starts on the button pass without changing the figure.
        if (!repeated.current) latest.current();
        repeated.current = false;
      }}
      className="flex w-11 flex-none touch-manipulation select-none items-center justify-center text-ink hover:bg-trough disabled:text-ink-2 disabled:hover:bg-transparent max-md:w-13"
    >
      <Icon size={18} strokeWidth={2.4} aria-hidden="true" />
    </button>
  );
}
