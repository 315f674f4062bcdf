import { useWatch } from "react-hook-form";
import { OptionalPart } from "../fields/optional-part.tsx";
import { SurveyChoice } from "../fields/survey-choice.tsx";
import { SurveyQuantity } from "../fields/survey-quantity.tsx";
import { SurveyReference } from "../fields/survey-reference.tsx";
import { useSurveyForm } from "../form-context.ts";
import { typicalQuantity } from "../fresh-parts.ts";

/** Leaks, wind, and for stock the air that has to be let in. */
export function AirSection() {
  const { control, library, system } = useSurveyForm();
  const kind = useWatch({ control, name: "use.kind" });
  const leakage = useWatch({ control, name: "leakage.class" });
  const entry = library.leakage.find((row) => row.id === leakage.value);
  return (
    <>
      <SurveyReference
        name="leakage.class"
        label="How tight the house is"
        options={library.leakage}
        about={(id) => {
          const row = library.leakage.find((candidate) => candidate.id === id);
          return row ? `${row.airChangesPerHour} air changes an hour` : "";
        }}
      />
      <OptionalPart
        name="leakage.airChanges"
        add="Type measured air changes"
        remove="Use the typical tightness"
        fresh={() => ({
          ...typicalQuantity(entry?.airChangesPerHour ?? 1, "airChange", system),
          origin: "guess",
        })}
      >
        <SurveyQuantity name="leakage.airChanges" label="Air changes" hint="with doors and vents shut" />
      </OptionalPart>
      <SurveyChoice
        name="shelter"
        label="Shelter from wind"
        options={[
          { value: "open", label: "Open" },
          { value: "normal", label: "Normal" },
          { value: "sheltered", label: "Sheltered" },
        ]}
      />
      {kind === "barn" ? (
        <>
          <OptionalPart
            name="use.winterVentilation"
            add="Type the winter ventilation you measured"
            remove="Work ventilation out from the stock"
            fresh={() => ({ ...typicalQuantity(1000, "airFlow", system), origin: "guess" })}
          >
            <SurveyQuantity
              name="use.winterVentilation"
              label="Winter ventilation"
              hint="the least the fans give in the cold"
            />
          </OptionalPart>
          <SurveyQuantity name="use.humidityLimit" label="Highest humidity wanted" />
          <SurveyQuantity
            name="use.heatRecovery"
            label="Heat recovered from the air"
            hint="0 without an exchanger"
          />
        </>
      ) : null}
    </>
  );
}
