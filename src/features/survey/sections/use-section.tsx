import { useFormContext, useWatch } from "react-hook-form";
import type { Survey } from "../../../../server/contracts/survey.ts";
import { unitsFor } from "../../../lib/units.ts";
import { SurveyQuantity } from "../fields/survey-quantity.tsx";
import { SurveyReference } from "../fields/survey-reference.tsx";
import { useSurveyForm } from "../form-context.ts";
import { typicalQuantity } from "../fresh-parts.ts";
import { MonthTable } from "./month-table.tsx";

interface Wanted {
  name: string;
  nightC: number;
  dayC: number;
  criticalC: number;
}

/** The crop's or animal's usual temperatures, as typical values in all twelve months. */
function useTypicalTemperatures(): (wanted: Wanted) => void {
  const { setValue, getValues } = useFormContext<Survey>();
  const { system } = useSurveyForm();
  return (wanted) => {
    const months = getValues("months").map((month) => ({
      ...month,
      nightSetpoint: typicalQuantity(wanted.nightC, "temperature", system),
      daySetpoint: typicalQuantity(wanted.dayC, "temperature", system),
    }));
    setValue("months", months, { shouldDirty: true, shouldValidate: true });
    setValue("criticalTemp", typicalQuantity(wanted.criticalC, "temperature", system), {
      shouldDirty: true,
      shouldValidate: true,
    });
  };
}

function Offer({ wanted, onTake }: { wanted: Wanted | null; onTake: (wanted: Wanted) => void }) {
  const { system, disabled } = useSurveyForm();
  const units = unitsFor(system);
  if (!wanted) return null;
  return (
    <p className="m-0 border-b border-rule px-4 py-2 text-sm md:px-0">
      {`Usual for ${wanted.name}: night ${units.roundTemperature(wanted.nightC)}, day ${units.roundTemperature(wanted.dayC)}, critical ${units.roundTemperature(wanted.criticalC)}. `}
      <button
        type="button"
        disabled={disabled}
        onClick={() => onTake(wanted)}
        className="min-h-11 font-semibold text-bottle underline underline-offset-4 hover:text-bottle-deep disabled:text-ink-2"
      >
        Fill all twelve months with these
      </button>
    </p>
  );
}

function GreenhouseUse() {
  const { control, library } = useSurveyForm();
  const take = useTypicalTemperatures();
  const crop = useWatch({ control, name: "use.crop" }) as { value: string } | undefined;
  const entry = library.crops.find((row) => row.id === crop?.value);
  return (
    <>
      <SurveyReference name="use.crop" label="Crop" options={library.crops} />
      <Offer wanted={entry ?? null} onTake={take} />
      <SurveyQuantity name="use.lamps" label="Lamp power for the floor area" hint="0 without lamps" />
      <SurveyQuantity name="use.lampHours" label="Lamp hours a day" />
    </>
  );
}

function BarnUse() {
  const { control, library } = useSurveyForm();
  const take = useTypicalTemperatures();
  const animal = useWatch({ control, name: "use.animal" }) as { value: string } | undefined;
  const entry = library.animals.find((row) => row.id === animal?.value);
  return (
    <>
      <SurveyReference name="use.animal" label="Animal" options={library.animals} />
      <Offer
        wanted={entry ? { ...entry, nightC: entry.typicalSetpointC, dayC: entry.typicalSetpointC } : null}
        onTake={take}
      />
      <MonthTable columns={["headCount", "mass"]} withOccupied title="Animals by month" />
    </>
  );
}

/** What is grown or kept. Months and numbers of stock decide its heat, so they are asked month by month. */
export function UseSection() {
  const { control } = useSurveyForm();
  const kind = useWatch({ control, name: "use.kind" });
  return kind === "greenhouse" ? <GreenhouseUse /> : <BarnUse />;
}
