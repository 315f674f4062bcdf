import { type InputHTMLAttributes, useId } from "react";

interface TextFieldProps extends Omit<InputHTMLAttributes<HTMLInputElement>, "onChange"> {
  label: string;
  value: string;
  onValue(value: string): void;
  hint?: string;
  /** A sentence from the server or the contract. */
  problem?: string;
}

/** Label, input, hint and the line where a problem is said. */
export function TextField({ label, value, onValue, hint, problem, className = "", ...rest }: TextFieldProps) {
  const id = useId();
  const described = [hint ? `${id}-hint` : "", problem ? `${id}-problem` : ""].filter(Boolean).join(" ");
  return (
    <div className={className}>
      <label htmlFor={id} className="block font-semibold">
        {label}
      </label>
      {hint ? (
        <p id={`${id}-hint`} className="m-0 text-sm text-ink-2">
          {hint}
        </p>
      ) : null}
      <input
        id={id}
        value={value}
        onChange={(event) => onValue(event.target.value)}
        aria-invalid={problem !== undefined}
        aria-describedby={described || undefined}
        className={`mt-1 min-h-11.5 w-full rounded-control border-[1.5px] bg-sheet px-3 ${problem ? "border-redlead" : "border-rule-strong"}`}
        {...rest}
      />
      {problem ? (
        <p id={`${id}-problem`} className="m-0 mt-1 text-sm font-semibold text-redlead">
          {problem}
        </p>
      ) : null}
    </div>
  );
}
