import { useController } from "react-hook-form";
import type { Quantity } from "../../../../server/contracts/quantity.ts";
import { QuantityField } from "../../../components/form/quantity-field.tsx";
import { type SurveyPath, useSurveyForm } from "../form-context.ts";
import { errorWords } from "./error-words.ts";

interface SurveyQuantityProps {
  name: SurveyPath;
  label: string;
  hint?: string;
}

/** A figure of the survey. The path must lead to a quantity; the sections see to that. */
export function SurveyQuantity({ name, label, hint }: SurveyQuantityProps) {
  const form = useSurveyForm();
  const { field, fieldState } = useController({ name, control: form.control });
  const value = field.value as Quantity | null | undefined;
  if (!value) return null;
  return (
    <QuantityField
      label={label}
      hint={hint}
      value={value}
      system={form.system}
      disabled={form.disabled}
      typedOrigin={form.typedOrigin}
      active={form.active === name}
      error={errorWords(fieldState.error) ?? form.refused[name]}
      onFocus={() => form.setActive(name)}
      onBlur={field.onBlur}
      onChange={(next) => {
        if (next.origin !== value.origin && next.typed === value.typed && next.origin !== "default") {
          form.setTypedOrigin(next.origin);
        }
        form.forget(name);
        field.onChange(next);
      }}
    />
  );
}
