import { Plus, Trash2 } from "lucide-react";
import { useFieldArray, useFormContext, useWatch } from "react-hook-form";
import type { Survey } from "../../../../server/contracts/survey.ts";
import { SurveyChoice } from "../fields/survey-choice.tsx";
import { SurveyQuantity } from "../fields/survey-quantity.tsx";
import { SurveyReference } from "../fields/survey-reference.tsx";
import { useSurveyForm } from "../form-context.ts";
import { freshHeater } from "../fresh-parts.ts";
import { FuelPrice } from "./fuel-price.tsx";

const MOST_HEATERS = 20;

function HeaterRow({ row, onRemove }: { row: number; onRemove: () => void }) {
  const { control, library, disabled } = useSurveyForm();
  const { register, setValue } = useFormContext<Survey>();
  const heater = useWatch({ control, name: `heaters.${row}` });
  if (!heater) return null;
  const type = library.heaterTypes.find((entry) => entry.id === heater.type.value);
  const fuels = library.fuels.filter(
    (fuel) => !type || type.fuels.length === 0 || type.fuels.includes(fuel.id),
  );
  return (
    <fieldset className="m-0 min-w-0 border-0 border-t-2 border-ink p-0 pt-1">
      <legend className="sr-only">{heater.label}</legend>
      <div className="flex items-center gap-2 px-4 py-1 md:px-0">
        <label className="flex-1">
          <span className="sr-only">Name of the heater</span>
          <input
            {...register(`heaters.${row}.label`)}
            disabled={disabled}
            maxLength={60}
            className="h-11 w-full rounded-control border-[1.5px] border-rule-strong bg-sheet px-2 font-bold"
          />
        </label>
        <button
          type="button"
          disabled={disabled}
          onClick={onRemove}
          aria-label={`Remove ${heater.label}`}
          className="flex size-11 items-center justify-center rounded-control border-[1.5px] border-rule-strong bg-sheet hover:bg-trough"
        >
          <Trash2 size={18} aria-hidden="true" />
        </button>
      </div>
      <SurveyReference
        name={`heaters.${row}.type`}
        label="Kind of heater"
        options={library.heaterTypes}
        about={(id) =>
          library.heaterTypes.find((entry) => entry.id === id)?.vented === false
            ? "no flue: fumes and water stay in the house"
            : ""
        }
        onChosen={(id) => {
          const chosen = library.heaterTypes.find((entry) => entry.id === id);
          if (!chosen) return;
          if (heater.efficiency.origin === "default") {
            setValue(`heaters.${row}.efficiency.typed`, String(Math.round(chosen.efficiencyFrac * 100)));
            setValue(`heaters.${row}.efficiency.unit`, "percent");
          }
          const fuel = chosen.fuels[0];
          if (fuel && !chosen.fuels.includes(heater.fuel.value)) setValue(`heaters.${row}.fuel.value`, fuel);
        }}
      />
      <SurveyQuantity name={`heaters.${row}.rating`} label="Heat on the plate, one heater" />
      <SurveyChoice
        name={`heaters.${row}.basis`}
        label="Is that input or output?"
        hint="input is what it burns; output is what the house gets"
        options={[
          { value: "input", label: "Input" },
          { value: "output", label: "Output" },
        ]}
      />
      <SurveyQuantity name={`heaters.${row}.efficiency`} label="Efficiency" />
      <SurveyQuantity name={`heaters.${row}.count`} label="How many of these" />
      <SurveyReference name={`heaters.${row}.fuel`} label="Fuel" options={fuels} />
    </fieldset>
  );
}

/** The heaters that stand there today, row by row, and the fuel of the house. */
export function HeatersSection() {
  const { control, library, disabled } = useSurveyForm();
  const { fields, append, remove } = useFieldArray({ control, name: "heaters" });
  const fuel = useWatch({ control, name: "fuel.value" });
  return (
    <>
      <SurveyReference name="fuel" label="Main fuel of the house" options={library.fuels} />
      <FuelPrice />
      {fields.length === 0 ? (
        <p className="m-0 border-b border-rule px-4 py-3 text-sm md:px-0">
          No heaters listed. The plan then says what to fit from nothing.
        </p>
      ) : null}
      {fields.map((entry, row) => (
        <HeaterRow key={entry.id} row={row} onRemove={() => remove(row)} />
      ))}
      <button
        type="button"
        disabled={disabled || fields.length >= MOST_HEATERS}
        onClick={() => append(freshHeater(library, fuel, fields.length + 1))}
        className="m-4 inline-flex min-h-11 items-center gap-2 rounded-control border-2 border-bottle bg-sheet px-4 font-bold text-bottle hover:bg-bottle-tint md:mx-0"
      >
        <Plus size={18} aria-hidden="true" />
        Add a heater
      </button>
    </>
  );
}
