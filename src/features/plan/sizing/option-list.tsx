import type { PlanResult } from "../../../../server/engine/plan/plan-types.ts";
import type { HeaterOption } from "../../../../server/engine/plan/sizing-types.ts";
import { OptionBar, optionScaleW } from "../../../components/plan/option-bar.tsx";
import type { Units } from "../../../lib/units.ts";

interface OptionListProps {
  result: PlanResult;
  chosenId: string | null;
  onChoose: (id: string) => void;
  units: Units;
}

function Detail({ option, result, units }: { option: HeaterOption; result: PlanResult; units: Units }) {
  const rows = [
    {
      name: option.spareW >= 0 ? "Spare on the coldest night" : "Short on the coldest night",
      value: units.text(Math.abs(option.spareW), "power"),
    },
    { name: "Ordinary cold night", value: option.holdsEveryday ? "holds" : "does not hold" },
    {
      name: "Largest heater out, house settles at",
      value: `${units.temperature(option.largestUnitOutSettlesAtC)}, ${option.largestUnitOutAboveCritical ? "above" : "below"} critical`,
    },
    {
      name: "For each square of floor",
      value: units.text(option.totalW / result.geometry.floorAreaM2, "heatFlux"),
    },
  ];
  return (
    <dl className="m-0 mt-1 text-sm">
      {rows.map((row) => (
        <div key={row.name} className="flex justify-between gap-3 border-t border-rule-strong py-1.5">
          <dt>{row.name}</dt>
          <dd className="m-0 text-right font-bold">{row.value}</dd>
        </div>
      ))}
    </dl>
  );
}

/** All ways of fitting the house, at one scale, with the need as a line through every bar. */
export function OptionList({ result, chosenId, onChoose, units }: OptionListProps) {
  const needW = result.sizing.onceInYearsRequiredW;
  const scaleW = optionScaleW(result.sizing.options, needW);
  return (
    <fieldset className="m-0 min-w-0 border-0 p-0">
      <legend className="sr-only">Choose the heaters</legend>
      {result.sizing.options.map((option) => {
        const chosen = option.id === chosenId;
        return (
          <label
            key={option.id}
            className={`grid cursor-pointer grid-cols-[32px_minmax(0,1fr)] border-b border-rule-strong py-3 pr-4 pl-3 has-focus-visible:outline-3 has-focus-visible:-outline-offset-3 has-focus-visible:outline-focus ${chosen ? "border-l-[6px] border-l-bottle bg-bottle-tint" : "border-l-[6px] border-l-transparent hover:bg-trough"}`}
          >
            <span className="pt-0.5">
              <input
                type="radio"
                name="option"
                checked={chosen}
                onChange={() => onChoose(option.id)}
                className="m-0 size-[22px] accent-bottle"
              />
            </span>
            <span className="block min-w-0">
              <span className="flex items-baseline justify-between gap-3">
                <b className="font-sign text-[17px]">{option.title}</b>
                <b className="whitespace-nowrap">{units.heat(option.totalW)}</b>
              </span>
              <OptionBar option={option} needW={needW} scaleW={scaleW} units={units} />
              <span className="block text-sm">{option.note}</span>
              {chosen ? <Detail option={option} result={result} units={units} /> : null}
            </span>
          </label>
        );
      })}
    </fieldset>
  );
}
