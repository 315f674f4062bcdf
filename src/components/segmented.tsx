import { useId } from "react";

export interface SegmentOption<T extends string> {
  value: T;
  label: string;
}

interface SegmentedProps<T extends string> {
  label: string;
  options: SegmentOption<T>[];
  value: T;
  onChange(value: T): void;
  /** Hides the label from sight; it is still read out. */
  quietLabel?: boolean;
}

/** One choice out of a few, side by side. Built on radio buttons, so arrow keys move the choice. */
export function Segmented<T extends string>({
  label,
  options,
  value,
  onChange,
  quietLabel = true,
}: SegmentedProps<T>) {
  const name = useId();
  return (
    <fieldset className="m-0 border-0 p-0">
      <legend className={quietLabel ? "sr-only" : "mb-1 text-sm text-ink-2"}>{label}</legend>
      <span className="inline-flex rounded-control border-[1.5px] border-rule-strong bg-sheet">
        {options.map((option, index) => (
          <label
            key={option.value}
            className={`relative flex min-h-10 cursor-pointer items-center px-3 text-sm has-focus-visible:z-10 has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-focus pointer-coarse:min-h-11 ${
              index > 0 ? "border-l-[1.5px] border-rule-strong" : ""
            } ${option.value === value ? "bg-ink font-bold text-sheet" : "hover:bg-trough"}`}
          >
            <input
              type="radio"
              name={name}
              value={option.value}
              checked={option.value === value}
              onChange={() => onChange(option.value)}
              className="sr-only"
            />
            {option.label}
          </label>
        ))}
      </span>
    </fieldset>
  );
}
