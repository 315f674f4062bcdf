import type { Quantity } from "../../../server/contracts/quantity.ts";
import type { UnitId } from "../../../server/engine/units.ts";
import { HoldButton } from "./hold-button.tsx";
import { stepped } from "./stepping.ts";
import { UnitSelect } from "./unit-select.tsx";

interface QuantityInputProps {
  id: string;
  /** What is typed, for spoken names. */
  subject: string;
  value: Quantity;
  onTyped: (text: string) => void;
  onUnit: (unit: UnitId) => void;
  invalid: boolean;
  describedBy?: string;
  disabled?: boolean;
  onFocus?: () => void;
  onBlur?: () => void;
}

/** Minus, figure with its unit, plus. Arrow keys step as the buttons do. */
export function QuantityInput(props: QuantityInputProps) {
  const { id, subject, value, onTyped, onUnit, invalid, describedBy, disabled, onFocus, onBlur } = props;
  const step = (direction: 1 | -1) => onTyped(stepped(value.typed, value.unit, direction));
  const edge = invalid ? "border-redlead" : "border-rule-strong";
  return (
    <div
      className={`flex h-[46px] items-stretch rounded-control border-[1.5px] bg-sheet focus-within:outline-3 focus-within:outline-offset-2 focus-within:outline-focus max-md:h-14 ${edge}`}
    >
      <HoldButton direction={-1} label={`Less: ${subject}`} onStep={() => step(-1)} disabled={disabled} />
      <div className="flex min-w-0 flex-1 border-x border-rule">
        <input
          id={id}
          type="text"
          inputMode="decimal"
          autoComplete="off"
          spellCheck={false}
          value={value.typed}
          disabled={disabled}
          aria-invalid={invalid}
          aria-describedby={describedBy}
          onChange={(event) => onTyped(event.target.value)}
          onKeyDown={(event) => {
            if (event.key !== "ArrowUp" && event.key !== "ArrowDown") return;
            event.preventDefault();
            step(event.key === "ArrowUp" ? 1 : -1);
          }}
          onFocus={(event) => {
            event.target.select();
            onFocus?.();
          }}
          onBlur={onBlur}
          className="w-0 min-w-0 flex-1 bg-transparent pr-1.5 pl-1 text-right text-lg font-bold text-ink outline-none disabled:text-ink-2"
        />
        <UnitSelect subject={subject} value={value.unit} onChange={onUnit} disabled={disabled} />
      </div>
      <HoldButton direction={1} label={`More: ${subject}`} onStep={() => step(1)} disabled={disabled} />
    </div>
  );
}
