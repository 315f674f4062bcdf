import { useId } from "react";
import type { Origin } from "../../../server/contracts/quantity.ts";
import { OriginGlyph } from "./origin-glyph.tsx";
import { originOrder, originWords } from "./origin-words.ts";

interface OriginSelectProps {
  /** What the origin belongs to, for the spoken name: "Ridge height". */
  subject: string;
  value: Origin;
  onChange: (origin: Origin) => void;
  disabled?: boolean;
}

/** Where an answer came from: a mark, a word, and a list to change it. */
export function OriginSelect({ subject, value, onChange, disabled }: OriginSelectProps) {
  const id = useId();
  const assumed = originWords[value].strength === "assumed";
  return (
    <span className="relative inline-flex min-h-11 items-center gap-2 px-1 text-sm">
      <label htmlFor={id} className="sr-only">
        {`Where this came from: ${subject}`}
      </label>
      <OriginGlyph origin={value} />
      <span
        aria-hidden="true"
        className={assumed ? "border-b-2 border-dashed border-rule-strong" : "border-b-2 border-transparent"}
      >
        {originWords[value].short}
      </span>
      <select
        id={id}
        value={value}
        disabled={disabled}
        onChange={(event) => onChange(originOrder.find((o) => o === event.target.value) ?? value)}
        className="absolute inset-0 h-full w-full cursor-pointer opacity-0 disabled:cursor-default [&:focus-visible]:opacity-100 [&:focus-visible]:bg-sheet"
      >
        {originOrder.map((origin) => (
          <option key={origin} value={origin}>
            {originWords[origin].long}
          </option>
        ))}
      </select>
    </span>
  );
}
