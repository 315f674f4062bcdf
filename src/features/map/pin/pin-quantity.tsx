import { useId } from "react";
import type { Quantity } from "../../../../server/contracts/quantity.ts";
import { OriginSelect } from "../../../components/form/origin-select.tsx";
import { QuantityInput } from "../../../components/form/quantity-input.tsx";
import { inUnit } from "../../../lib/quantity-value.ts";

interface PinQuantityProps {
  label: string;
  hint?: string;
  value: Quantity;
  onChange(value: Quantity): void;
  problem?: string;
}

/** A size of the ground plan, with steppers, unit and where it came from. */
export function PinQuantity({ label, hint, value, onChange, problem }: PinQuantityProps) {
  const id = useId();
  return (
    <div>
      <div className="flex items-center justify-between gap-3">
        <label htmlFor={id} className="font-semibold">
          {label}
          {hint ? <span className="block text-xs font-normal text-ink-2">{hint}</span> : null}
        </label>
        <OriginSelect
          subject={label}
          value={value.origin}
          onChange={(origin) => onChange({ ...value, origin })}
        />
      </div>
      <QuantityInput
        id={id}
        subject={label}
        value={value}
        onTyped={(typed) =>
          onChange({ ...value, typed, origin: value.origin === "default" ? "guess" : value.origin })
        }
        onUnit={(unit) => onChange(inUnit(value, unit))}
        invalid={problem !== undefined}
        describedBy={problem ? `${id}-problem` : undefined}
      />
      {problem ? (
        <p id={`${id}-problem`} className="m-0 mt-1 text-sm font-semibold text-redlead">
          {problem}
        </p>
      ) : null}
    </div>
  );
}
