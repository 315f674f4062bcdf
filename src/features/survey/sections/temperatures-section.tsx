import { useWatch } from "react-hook-form";
import { SurveyQuantity } from "../fields/survey-quantity.tsx";
import { useSurveyForm } from "../form-context.ts";
import { MonthTable } from "./month-table.tsx";

/** What the house is to be kept at, month by month, and where harm begins. */
export function TemperaturesSection() {
  const { control } = useSurveyForm();
  const kind = useWatch({ control, name: "use.kind" });
  return (
    <>
      <SurveyQuantity
        name="criticalTemp"
        label="Critical temperature"
        hint={kind === "barn" ? "below it the animals suffer" : "below it the crop is harmed"}
      />
      <MonthTable
        columns={["nightSetpoint", "daySetpoint"]}
        withOccupied={kind === "greenhouse"}
        title="Temperatures by month"
      />
    </>
  );
}
