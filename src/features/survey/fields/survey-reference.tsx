import { useId } from "react";
import { useController } from "react-hook-form";
import type { LibraryEntry } from "../../../../server/contracts/library.ts";
import type { Origin } from "../../../../server/contracts/quantity.ts";
import { FieldRow } from "../../../components/form/field-row.tsx";
import { OriginSelect } from "../../../components/form/origin-select.tsx";
import { ReferenceSelect } from "../../../components/form/reference-select.tsx";
import { type SurveyPath, useSurveyForm } from "../form-context.ts";
import { errorWords } from "./error-words.ts";

interface SurveyReferenceProps {
  name: SurveyPath;
  label: string;
  options: LibraryEntry[];
  /** Words about the chosen entry, such as its U-value. */
  about?: (id: string) => string;
  onChosen?: (id: string) => void;
}

/** An answer out of the library. The chosen entry's figures and their source stand below the question. */
export function SurveyReference({ name, label, options, about, onChosen }: SurveyReferenceProps) {
  const form = useSurveyForm();
  const id = useId();
  const { field, fieldState } = useController({ name, control: form.control });
  const value = field.value as { value: string; origin: Origin } | null | undefined;
  if (!value) return null;
  const chosen = options.find((option) => option.id === value.value);
  const error = errorWords(fieldState.error) ?? form.refused[name] ?? form.refused[`${name}.value`];
  const change = (next: { value: string; origin: Origin }) => {
    form.forget(name);
    field.onChange(next);
  };
  return (
    <FieldRow
      label={<label htmlFor={id}>{label}</label>}
      hint={
        chosen ? (
          <>
            {about ? <span className="block">{about(chosen.id)}</span> : null}
            <span className="block">{`Source: ${chosen.source}`}</span>
          </>
        ) : undefined
      }
      error={error}
      errorId={`${id}-error`}
      hintId={`${id}-hint`}
      active={form.active === name}
      control={
        <ReferenceSelect
          id={id}
          value={value.value}
          options={options}
          invalid={error !== undefined}
          describedBy={chosen ? `${id}-hint ${id}-error` : `${id}-error`}
          disabled={form.disabled}
          onFocus={() => form.setActive(name)}
          onChange={(next) => {
            change({
              value: next,
              origin: value.origin === "default" ? form.typedOrigin : value.origin,
            });
            onChosen?.(next);
          }}
        />
      }
      origin={
        <OriginSelect
          subject={label}
          value={value.origin}
          disabled={form.disabled}
          onChange={(origin) => change({ ...value, origin })}
        />
      }
    />
  );
}
