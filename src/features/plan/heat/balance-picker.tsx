import type { PlanResult } from "../../../../server/engine/plan/plan-types.ts";
import { ChoiceButtons } from "../../../components/form/choice-buttons.tsx";
import { rarity, stateWords } from "../../../components/plan/state-words.ts";
import { monthAbbreviation, monthName } from "../../../lib/format.ts";
import type { Units } from "../../../lib/units.ts";
import { type Selection, statesOf } from "./selection.ts";

interface BalancePickerProps {
  result: PlanResult;
  selection: Selection;
  hasScreen: boolean;
  onSelect: (part: Partial<Selection>) => void;
  units: Units;
}

/** Twelve month cells, each with its greatest need; the night; the state of the house. */
export function BalancePicker({ result, selection, hasScreen, onSelect, units }: BalancePickerProps) {
  const month = result.months.find((entry) => entry.month === selection.month);
  const states = month ? statesOf(month, selection.night) : [];
  const need = (index: number) => {
    const entry = result.months[index];
    if (!entry) return "";
    const needW = selection.night === "everyday" ? entry.everydayRequiredW : entry.onceInYearsRequiredW;
    if (needW <= 0) return "\u2013";
    return units.figure(needW, "power", { decimals: units.amount(needW, "power") < 10 ? 1 : 0 }).value;
  };
  return (
    <div className="grid gap-3 border-t border-rule-strong p-4 print:hidden">
      <p className="m-0 text-sm text-ink-2">
        <b className="text-ink">Month</b> with the heat needed on the chosen night, {units.symbol("power")}
      </p>
      <fieldset className="m-0 grid min-w-0 grid-cols-4 border-t border-l border-rule-strong p-0 sm:grid-cols-6 lg:grid-cols-12">
        <legend className="sr-only">Month</legend>
        {result.months.map((entry, index) => {
          const chosen = entry.month === selection.month;
          return (
            <label
              key={entry.month}
              className={`flex min-h-12 cursor-pointer flex-wrap content-center items-center justify-between border-r border-b border-rule-strong px-2.5 text-sm has-focus-visible:z-1 has-focus-visible:outline-3 has-focus-visible:outline-focus ${chosen ? "bg-ink text-sheet" : "bg-sheet hover:bg-trough"}`}
            >
              <input
                type="radio"
                name="month"
                className="sr-only"
                checked={chosen}
                onChange={() => onSelect({ month: entry.month })}
                aria-label={`${monthName(entry.month)}, ${need(index)} ${units.symbol("power")}`}
              />
              <b>{monthAbbreviation(entry.month)}</b>
              <span className="text-xs">{need(index)}</span>
            </label>
          );
        })}
      </fieldset>
      <div className="grid gap-3 lg:grid-cols-[auto_1fr]">
        <ChoiceButtons
          legend="Which night"
          name="night"
          value={selection.night}
          onChange={(night) => onSelect({ night })}
          options={[
            { value: "everyday", label: "Ordinary cold night" },
            { value: "onceInYears", label: `Coldest night ${rarity(result.returnPeriodYears)}` },
          ]}
        />
        {states.length > 1 ? (
          <ChoiceButtons
            legend="State of the house"
            name="state"
            value={selection.state}
            onChange={(state) => onSelect({ state })}
            options={states.map((state) => ({ value: state, label: stateWords(state, hasScreen) }))}
          />
        ) : null}
      </div>
    </div>
  );
}
