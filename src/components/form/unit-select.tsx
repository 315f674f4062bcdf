import { type UnitId, type UnitKind, units } from "../../../server/engine/units.ts";

/** Units a person may type a kind in. A share is always typed in percent. */
export function unitsOffered(kind: UnitKind): UnitId[] {
  return (Object.keys(units) as UnitId[]).filter((unit) => units[unit].kind === kind && unit !== "share");
}

interface UnitSelectProps {
  subject: string;
  value: UnitId;
  onChange: (unit: UnitId) => void;
  disabled?: boolean;
}

/** The unit beside a number. Where there is a choice it can be switched in place. */
export function UnitSelect({ subject, value, onChange, disabled }: UnitSelectProps) {
  const offered = unitsOffered(units[value].kind);
  const symbol = units[value].symbol;
  if (offered.length < 2) {
    return symbol === "" ? null : (
      <span className="flex-none self-center pr-2 text-sm text-ink-2">{symbol}</span>
    );
  }
  return (
    <span className="relative flex flex-none items-center pr-2 text-sm text-ink-2 focus-within:text-ink">
      <span aria-hidden="true" className="border-b border-dotted border-rule-strong">
        {symbol}
      </span>
      <select
        aria-label={`Unit of ${subject}`}
        value={value}
        disabled={disabled}
        onChange={(event) => onChange(offered.find((unit) => unit === event.target.value) ?? value)}
        className="absolute inset-y-0 -left-2 right-0 min-w-11 cursor-pointer opacity-0 [&:focus-visible]:opacity-100 [&:focus-visible]:bg-sheet"
      >
        {offered.map((unit) => (
          <option key={unit} value={unit}>
            {units[unit].symbol}
          </option>
        ))}
      </select>
    </span>
  );
}
