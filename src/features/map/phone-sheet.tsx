import { type CSSProperties, type PointerEvent, type ReactNode, useRef, useState } from "react";

const HEIGHTS = ["low", "half", "full"] as const;
type SheetHeight = (typeof HEIGHTS)[number];

const share: Record<SheetHeight, number> = { low: 0.17, half: 0.52, full: 0.94 };
const words: Record<SheetHeight, string> = { low: "low", half: "half open", full: "open" };
/** A shorter move is a tap on the grip, not a drag. */
const TAP_PX = 6;

interface PhoneSheetProps {
  label: string;
  children: ReactNode;
}

function nearest(wanted: number): SheetHeight {
  return HEIGHTS.reduce((best, height) =>
    Math.abs(share[height] - wanted) < Math.abs(share[best] - wanted) ? height : best,
  );
}

/** A sheet below the map with three heights: dragged by its grip, or stepped by tapping it. On a desk it is a column. */
export function PhoneSheet({ label, children }: PhoneSheetProps) {
  const [height, setHeight] = useState<SheetHeight>("half");
  const [dragged, setDragged] = useState<number | null>(null);
  const sheet = useRef<HTMLElement>(null);
  const start = useRef({ y: 0, share: 0 });
  const room = () => sheet.current?.parentElement?.clientHeight ?? 1;
  const onPointerDown = (event: PointerEvent<HTMLButtonElement>) => {
    event.currentTarget.setPointerCapture(event.pointerId);
    start.current = { y: event.clientY, share: share[height] };
  };
  const onPointerMove = (event: PointerEvent<HTMLButtonElement>) => {
    if (!event.currentTarget.hasPointerCapture(event.pointerId)) return;
    const moved = start.current.y - event.clientY;
    if (dragged === null && Math.abs(moved) < TAP_PX) return;
    setDragged(Math.min(0.96, Math.max(0.1, start.current.share + moved / room())));
  };
  const step = () => {
    if (dragged !== null) {
      setHeight(nearest(dragged));
      setDragged(null);
      return;
    }
    setHeight(HEIGHTS[(HEIGHTS.indexOf(height) + 1) % HEIGHTS.length] ?? "half");
  };
  return (
    <section
      ref={sheet}
      aria-label={label}
      className="flex min-h-0 flex-col bg-limewash max-md:order-2 max-md:h-(--sheet-height) max-md:flex-none max-md:border-t-2 max-md:border-ink md:border-r-2 md:border-ink"
      style={{ "--sheet-height": `${(dragged ?? share[height]) * 100}%` } as CSSProperties}
    >
      <button
        type="button"
        className="flex min-h-11 flex-none touch-none items-center justify-center md:hidden"
        aria-label={`Sheet is ${words[height]}. Change its height`}
        onPointerDown={onPointerDown}
        onPointerMove={onPointerMove}
        onPointerCancel={() => setDragged(null)}
        onClick={step}
      >
        <span className="h-1.5 w-14 rounded-full bg-rule-strong" />
      </button>
      {children}
    </section>
  );
}
