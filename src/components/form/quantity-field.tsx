import { useId } from "react";
import type { Quantity } from "../../../server/contracts/quantity.ts";
import type { UnitSystem } from "../../../server/engine/units.ts";
import { inUnit } from "../../lib/quantity-value.ts";
import { FieldRow } from "./field-row.tsx";
import { OriginSelect } from "./origin-select.tsx";
import { QuantityInput } from "./quantity-input.tsx";
import { shownQuantity } from "./shown-quantity.ts";

interface QuantityFieldProps {
  label: string;
  hint?: string;
  value: Quantity;
  onChange: (next: Quantity) => void;
  system: UnitSystem;
  error?: string;
  disabled?: boolean;
  active?: boolean;
  onFocus?: () => void;
  onBlur?: () => void;
  /** The origin a figure gets when a person types over a typical value. */
  typedOrigin: Quantity["origin"];
}

/** A measured figure: stepper, figure as typed, unit, and where it came from. */
export function QuantityField(props: QuantityFieldProps) {
  const { label, hint, value, onChange, system, error, disabled, active, typedOrigin } = props;
  const id = useId();
  const shown = shownQuantity(value, system);
  const typed = (text: string) =>
    onChange({
      typed: text,
      unit: shown.unit,
      origin: value.origin === "default" ? typedOrigin : value.origin,
    });
  return (
    <FieldRow
      label={<label htmlFor={id}>{label}</label>}
      hint={hint}
      error={error}
      errorId={`${id}-error`}
      hintId={`${id}-hint`}
      active={active}
      control={
        <QuantityInput
          id={id}
          subject={label}
          value={shown}
          onTyped={typed}
          onUnit={(unit) => onChange(inUnit(shown, unit))}
          invalid={error !== undefined}
          describedBy={hint ? `${id}-hint ${id}-error` : `${id}-error`}
          disabled={disabled}
          onFocus={props.onFocus}
          onBlur={props.onBlur}
        />
      }
      origin={
        <OriginSelect
          subject={label}
          value={value.origin}
          disabled={disabled}
          onChange={(origin) => onChange({ ...shown, origin })}
        />
      }
    />
  );
}
