import type { ReactNode } from "react";

export interface ChoiceOption<T extends string> {
  value: T;
  label: string;
  picture?: ReactNode;
}

interface ChoiceButtonsProps<T extends string> {
  /** Spoken name of the group. */
  legend: string;
  name: string;
  value: T;
  options: ChoiceOption<T>[];
  onChange: (value: T) => void;
  disabled?: boolean;
  describedBy?: string;
}

/** A few answers side by side; native radio buttons, so that arrow keys and screen readers work as usual. */
export function ChoiceButtons<T extends string>(props: ChoiceButtonsProps<T>) {
  const { legend, name, value, options, onChange, disabled, describedBy } = props;
  const pictured = options.some((option) => option.picture !== undefined);
  return (
    <fieldset
      disabled={disabled}
      aria-describedby={describedBy}
      className={
        pictured
          ? "grid grid-cols-3 border-t-[1.5px] border-l-[1.5px] border-rule-strong sm:grid-cols-4 xl:grid-cols-7"
          : "flex"
      }
    >
      <legend className="sr-only">{legend}</legend>
      {options.map((option) => {
        const chosen = option.value === value;
        const shape = pictured
          ? "min-h-[76px] flex-col justify-end gap-1 border-r-[1.5px] border-b-[1.5px] pt-2 pb-1.5 text-sm font-semibold"
          : "min-h-[46px] flex-1 justify-center border-[1.5px] max-md:min-h-13 -ml-[1.5px] first-of-type:ml-0 first-of-type:rounded-l-control last-of-type:rounded-r-control";
        return (
          <label
            key={option.value}
            className={`relative flex cursor-pointer items-center border-rule-strong px-2 text-center has-focus-visible:z-1 has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-focus ${shape} ${chosen ? "bg-ink font-bold text-sheet" : "bg-sheet hover:bg-trough"}`}
          >
            <input
              type="radio"
              name={name}
              value={option.value}
              checked={chosen}
              onChange={() => onChange(option.value)}
              className="sr-only"
            />
            {option.picture}
            {option.label}
          </label>
        );
      })}
    </fieldset>
  );
}
