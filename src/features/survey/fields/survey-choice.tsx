import { useId } from "react";
import { useController } from "react-hook-form";
import type { Origin } from "../../../../server/contracts/quantity.ts";
import { ChoiceButtons, type ChoiceOption } from "../../../components/form/choice-buttons.tsx";
import { FieldRow } from "../../../components/form/field-row.tsx";
import { OriginSelect } from "../../../components/form/origin-select.tsx";
import { type SurveyPath, useSurveyForm } from "../form-context.ts";
import { errorWords } from "./error-words.ts";

interface SurveyChoiceProps<T extends string> {
  name: SurveyPath;
  label: string;
  hint?: string;
  options: ChoiceOption<T>[];
}

/** A question with two or three answers. */
export function SurveyChoice<T extends string>({ name, label, hint, options }: SurveyChoiceProps<T>) {
  const form = useSurveyForm();
  const id = useId();
  const { field, fieldState } = useController({ name, control: form.control });
  const value = field.value as { value: T; origin: Origin } | null | undefined;
  if (!value) return null;
  return (
    <FieldRow
      label={label}
      hint={hint}
      error={errorWords(fieldState.error) ?? form.refused[name]}
      errorId={`${id}-error`}
      hintId={`${id}-hint`}
      control={
        <ChoiceButtons
          legend={label}
          name={`${id}-choice`}
          value={value.value}
          options={options}
          disabled={form.disabled}
          describedBy={`${id}-error`}
          onChange={(next) => {
            form.forget(name);
            field.onChange({
              value: next,
              origin: value.origin === "default" ? form.typedOrigin : value.origin,
            });
          }}
        />
      }
      origin={
        <OriginSelect
          subject={label}
          value={value.origin}
          disabled={form.disabled}
          onChange={(origin) => field.onChange({ ...value, origin })}
        />
      }
    />
  );
}
