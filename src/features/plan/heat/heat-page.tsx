import { Link, useSearchParams } from "react-router-dom";
import { AssumptionGroups } from "../../../components/plan/assumption-groups.tsx";
import { BuildingHead } from "../../../components/plan/building-head.tsx";
import { headline } from "../../../components/plan/plan-sentences.ts";
import { rarity, stateWords, verdictWords } from "../../../components/plan/state-words.ts";
import { WarningList } from "../../../components/plan/warning-list.tsx";
import { flowsOf } from "../../../components/section-drawing/heat-paths.ts";
import { spokenFlows } from "../../../components/section-drawing/spoken-flows.ts";
import { day, monthName } from "../../../lib/format.ts";
import type { LoadedPlan } from "../latest-plan.tsx";
import { BalancePicker } from "./balance-picker.tsx";
import { BalanceTable } from "./balance-table.tsx";
import { DayPart } from "./day-part.tsx";
import { flowWriter } from "./flow-writer.ts";
import { SectionPanel } from "./section-panel.tsx";
import { readSelection, type Selection, selectedBalance } from "./selection.ts";
import { StationPart } from "./station-part.tsx";
import { SurfaceTable } from "./surface-table.tsx";
import { YearChart, YearTable } from "./year.tsx";

function fileName(building: LoadedPlan["building"], what: string): string {
  const plain = `${building.farmName} ${building.name}`.toLowerCase().replace(/[^a-z0-9]+/g, "-");
  return `${plain}-${what}.csv`;
}

/** Answer first, then the house with its heat, then the year, then what it all rests on. */
export function HeatPage({ building, plan, library, units }: LoadedPlan) {
  const { result } = plan;
  const [params, setParams] = useSearchParams();
  const selection = readSelection(params, result);
  const balance = selectedBalance(result, selection);
  const hasScreen = plan.survey.screen !== null;
  const words = headline(building.name, result, units);
  const month = result.months.find((entry) => entry.month === selection.month);
  const select = (part: Partial<Selection>) =>
    setParams(
      (before) => {
        const next = new URLSearchParams(before);
        for (const [key, value] of Object.entries(part)) next.set(key, String(value));
        return next;
      },
      { replace: true, preventScrollReset: true },
    );
  const night =
    selection.night === "everyday"
      ? "ordinary cold night"
      : `coldest night ${rarity(result.returnPeriodYears)}`;
  return (
    <>
      <BuildingHead
        building={building}
        units={units}
        status={`Plan ${plan.number} of ${day(plan.createdAt)}`}
      />
      {plan.outdated ? (
        <p role="status" className="m-0 border-b-2 border-straw bg-straw-tint px-4 py-2 text-sm">
          <b>The survey was changed after this was worked out.</b> Press “Work out the heat” in the survey for
          fresh figures.
        </p>
      ) : null}
      <div className="border-b border-rule-strong bg-sheet px-4 py-4">
        <p className="m-0 font-sign text-xl font-bold">{words.first}</p>
        <p className="m-0 max-w-[100ch]">{words.second}</p>
      </div>
      <div className="xl:grid xl:grid-cols-[minmax(0,2fr)_minmax(0,1fr)] xl:border-b-2 xl:border-ink">
        <div className="min-w-0 bg-sheet">
          {balance ? (
            <SectionPanel
              plan={plan}
              balance={balance}
              occupied={month?.occupied ?? true}
              covers={library?.covers}
              units={units}
            />
          ) : (
            <p className="m-0 p-6">For this night nothing could be worked out; see the warnings.</p>
          )}
          <BalancePicker
            result={result}
            selection={selection}
            hasScreen={hasScreen}
            onSelect={select}
            units={units}
          />
          {month ? (
            <div className="border-t border-rule p-4">
              <DayPart month={month} result={result} units={units} fileName={fileName(building, "day")} />
            </div>
          ) : null}
        </div>
        <div className="min-w-0 border-ink p-4 max-xl:border-t-2 xl:border-l-2">
          <h2 className="m-0 font-sign text-lg font-bold">{`${monthName(selection.month)}, ${night}`}</h2>
          {balance ? (
            <>
              <p className="m-0 pb-2 text-sm text-ink-2">
                {`${stateWords(selection.state, hasScreen)}. ${verdictWords[balance.verdict]}: settles at ${units.temperature(balance.settlesAtC)} with ${units.heat(balance.installedHeatW)} running.`}
              </p>
              <p className="sr-only" aria-live="polite">
                {spokenFlows(
                  flowsOf(balance),
                  {
                    insideC: balance.insideTempC,
                    outsideC: balance.outdoorTempC,
                    skyC: balance.skyTempC,
                    soilC: balance.soilTempC,
                    faces: [],
                  },
                  flowWriter(flowsOf(balance), units).full,
                  units.system,
                )}
              </p>
              <BalanceTable balance={balance} result={result} units={units} />
            </>
          ) : null}
          <div className="mt-3">
            <WarningList
              warnings={result.warnings}
              renderLink={(field) =>
                building.can.readSurvey ? (
                  <Link
                    to={`/buildings/${building.id}/survey?part=${surveyPart(field)}`}
                    className="font-semibold text-bottle underline underline-offset-4 hover:text-bottle-deep"
                  >
                    Go to the answer
                  </Link>
                ) : null
              }
            />
          </div>
        </div>
      </div>
      <div className="grid gap-8 p-4 xl:grid-cols-2 [&>*]:min-w-0">
        <YearChart result={result} units={units} fileName={fileName(building, "heat-by-month")} />
        {balance ? (
          <section aria-labelledby="surfaces-heading">
            <h2 id="surfaces-heading" className="m-0 font-sign text-lg font-bold">
              Surface by surface
            </h2>
            <p className="m-0 text-sm text-ink-2">{`${monthName(selection.month)}, ${night}`}</p>
            <SurfaceTable balance={balance} units={units} />
          </section>
        ) : null}
        <section aria-labelledby="year-heading" className="xl:col-span-2">
          <h2 id="year-heading" className="m-0 font-sign text-lg font-bold">
            Month by month
          </h2>
          <YearTable result={result} units={units} />
        </section>
        <StationPart result={result} units={units} />
        <AssumptionGroups assumptions={result.assumptions} units={units} />
      </div>
    </>
  );
}

/** Which group of the survey asks for an answer; the survey itself knows the same by its own list. */
function surveyPart(field: string): string {
  const starts: [string, string][] = [
    ["covers", "cover"],
    ["screen", "cover"],
    ["leakage", "air"],
    ["shelter", "air"],
    ["use.winterVentilation", "air"],
    ["use.humidityLimit", "air"],
    ["use.heatRecovery", "air"],
    ["floor", "floor"],
    ["elevation", "floor"],
    ["frostHollow", "floor"],
    ["use", "use"],
    ["months", "temperatures"],
    ["criticalTemp", "temperatures"],
    ["heaters", "heaters"],
    ["fuel", "heaters"],
  ];
  return starts.find(([start]) => field.startsWith(start))?.[1] ?? "shape";
}
