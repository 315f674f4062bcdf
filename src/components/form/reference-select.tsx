interface ReferenceOption {
  id: string;
  name: string;
  group: string;
  source: string;
}

interface ReferenceSelectProps {
  id: string;
  value: string;
  options: ReferenceOption[];
  onChange: (id: string) => void;
  invalid: boolean;
  describedBy?: string;
  disabled?: boolean;
  onFocus?: () => void;
}

/** A list from the library, by group. An entry the library no longer has stays visible as such. */
export function ReferenceSelect(props: ReferenceSelectProps) {
  const { id, value, options, onChange, invalid, describedBy, disabled, onFocus } = props;
  const groups = [...new Set(options.map((option) => option.group))];
  const known = options.some((option) => option.id === value);
  return (
    <select
      id={id}
      value={value}
      disabled={disabled}
      aria-invalid={invalid}
      aria-describedby={describedBy}
      onFocus={onFocus}
      onChange={(event) => onChange(event.target.value)}
      className={`h-[46px] w-full rounded-control border-[1.5px] bg-sheet px-2 font-semibold text-ink max-md:h-14 ${invalid ? "border-redlead" : "border-rule-strong"}`}
    >
      {known ? null : <option value={value}>{`Not in the library: ${value}`}</option>}
      {groups.length < 2
        ? options.map((option) => (
            <option key={option.id} value={option.id}>
              {option.name}
            </option>
          ))
        : groups.map((group) => (
            <optgroup key={group} label={group}>
              {options
                .filter((option) => option.group === group)
                .map((option) => (
                  <option key={option.id} value={option.id}>
                    {option.name}
                  </option>
                ))}
            </optgroup>
          ))}
    </select>
  );
}
