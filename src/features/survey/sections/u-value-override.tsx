import { OptionalPart } from "../fields/optional-part.tsx";
import { SurveyQuantity } from "../fields/survey-quantity.tsx";
import { type SurveyPath, useSurveyForm } from "../form-context.ts";
import { typicalQuantity } from "../fresh-parts.ts";

/** A U-value somebody knows takes the place of the library's layers. */
export function UValueOverride({ name, of, startWM2K }: { name: SurveyPath; of: string; startWM2K: number }) {
  const { system } = useSurveyForm();
  return (
    <OptionalPart
      name={name}
      add={`Type a U-value for the ${of}`}
      remove={`Use the library's layers for the ${of}`}
      fresh={() => ({ ...typicalQuantity(startWM2K, "uValue", system), origin: "guess" })}
    >
      <SurveyQuantity name={name} label={`U-value, ${of}`} hint="takes the place of the layers" />
    </OptionalPart>
  );
}
