import type { LibraryView } from "../../../server/contracts/library.ts";
import type { PlanView } from "../../../server/contracts/plans.ts";
import { NeedStepsChart } from "../../components/chart/need-steps.tsx";
import { headline } from "../../components/plan/plan-sentences.ts";
import { shapeNames } from "../../components/plan/shape-names.ts";
import { hatch, PathMark } from "../../components/section-drawing/hatches.tsx";
import {
  flowsOf,
  heatPaths,
  pathsIn,
  pathsOut,
  totalOut,
} from "../../components/section-drawing/heat-paths.ts";
import { SectionHeat } from "../../components/section-drawing/section-heat.tsx";
import { sectionShape } from "../../components/section-drawing/section-shape.ts";
import { shellOf } from "../../components/section-drawing/survey-shell.ts";
import { day, joined, monthName } from "../../lib/format.ts";
import type { Units } from "../../lib/units.ts";
import { managementSentences, statusWords } from "./plain-words.ts";

interface PrintSheetProps {
  plan: PlanView;
  library: LibraryView | undefined;
  units: Units;
}

/** The plan on paper: sentence, drawing, losses, months, what was assumed, and room to sign. */
export function PrintSheet({ plan, library, units }: PrintSheetProps) {
  const { result } = plan;
  const month = result.months.find((entry) => entry.month === result.sizing.onceInYearsMonth);
  const balance = month?.onceInYears.screensShut ?? (month && Object.values(month.onceInYears)[0]);
  const shape = sectionShape(plan.survey.shape);
  const words = headline(plan.building.name, result, units);
  const proposed = result.sizing.options.find((option) => option.id === plan.proposedOptionId);
  const flows = balance && flowsOf(balance);
  const decimals = units.amount(Math.max(0, ...Object.values(flows ?? {})), "power") >= 1000 ? 0 : 1;
  const power = (heatW: number) => units.figure(heatW, "power", { decimals });
  const missingW = Math.max(0, result.sizing.onceInYearsRequiredW - result.sizing.installedW);
  const cells = [
    {
      name: "Built",
      value: `${shapeNames[plan.building.shapeType]}, ${units.figure(plan.building.widthM, "length", { decimals: 1 }).value} × ${units.text(plan.building.lengthM, "length", { decimals: 1 })}`,
    },
    { name: "Heat in a year", value: units.energy(result.annual.heaterKwh) },
    { name: "Weather from", value: result.station.name },
    { name: "Suggested", value: proposed?.title ?? "nothing yet" },
    { name: "Worked out by", value: `${plan.createdBy}, ${day(plan.createdAt)}` },
    { name: "State", value: statusWords[plan.status] },
  ];
  return (
    <div className="hidden bg-sheet text-[13px] leading-snug [--color-limewash:var(--color-sheet)] print:block">
      <p className="m-0 flex justify-between border-b-2 border-ink pb-1 text-xs">
        <b>Glassbyre heat plan</b>
        <span>{`Plan ${plan.number}, ${plan.building.farmName}, ${day(plan.createdAt)}`}</span>
      </p>
      <h1 className="m-0 mt-3 font-sign text-2xl font-extrabold">{`${plan.building.name}, ${plan.building.farmName}`}</h1>
      <p className="m-0 text-base">{`${words.first} ${words.second}`}</p>
      {shape && balance && flows ? (
        <figure className="m-0 mt-2 break-inside-avoid border border-ink bg-sheet">
          <SectionHeat
            shape={shape}
            shell={shellOf(plan.survey, library?.covers)}
            flows={flows}
            temperatures={{
              insideC: balance.insideTempC,
              outsideC: balance.outdoorTempC,
              skyC: balance.skyTempC,
              soilC: balance.soilTempC,
              faces: [],
            }}
            greatestFlowW={Math.max(...Object.values(flows))}
            system={units.system}
            layout="wide"
            written={(heatW) => joined(power(heatW))}
            bare={(heatW) => power(heatW).value}
            unit={units.symbol("power")}
            weather=""
          />
          <figcaption className="border-t border-ink px-2 py-1">
            {`Section in ${monthName(balance.month)}, coldest night once in ${result.returnPeriodYears} years. Arrow widths follow the heat written beside them.`}
          </figcaption>
        </figure>
      ) : null}
      <div className="mt-3 grid grid-cols-[42%_1fr] gap-5 break-inside-avoid">
        {flows ? (
          <table className="w-full border-collapse">
            <thead>
              <tr className="border-b border-ink">
                <th className="text-left">On that night</th>
                <th className="text-right">{units.symbol("power")}</th>
              </tr>
            </thead>
            <tbody>
              {[...pathsOut, ...pathsIn.filter((path) => path !== "heater" && flows[path] > 50)].map(
                (path) => (
                  <tr key={path} className="border-b border-rule">
                    <th className="py-1 text-left font-normal">
                      <PathMark path={path} size={13} /> {heatPaths[path].name}
                    </th>
                    <td className="text-right">{power(flows[path]).value}</td>
                  </tr>
                ),
              )}
              <tr className="border-b border-rule font-bold">
                <th className="py-1 text-left">All losses</th>
                <td className="text-right">{power(totalOut(flows)).value}</td>
              </tr>
              <tr className="border-b border-rule font-bold">
                <th className="py-1 text-left">Heat needed</th>
                <td className="text-right">{power(flows.heater).value}</td>
              </tr>
              <tr className="border-b border-rule">
                <th className="py-1 text-left font-normal">Fitted now</th>
                <td className="text-right">{power(result.sizing.installedW).value}</td>
              </tr>
              {missingW > 0 ? (
                <tr className="border-b border-ink font-bold">
                  <th className="py-1 text-left">
                    <svg width="15" height="15" aria-hidden="true" className="inline-block align-[-3px]">
                      <rect width="15" height="15" fill={hatch("short")} stroke="var(--color-redlead)" />
                    </svg>{" "}
                    Short
                  </th>
                  <td className="text-right">{power(missingW).value}</td>
                </tr>
              ) : null}
            </tbody>
          </table>
        ) : null}
        <div>
          <b>{`Needed each month, ${units.symbol("power")}`}</b>
          <NeedStepsChart
            width={370}
            height={210}
            unit={units.symbol("power")}
            installedWords={`Fitted ${units.heat(result.sizing.installedW)}`}
            proposedWords={proposed ? `Suggested ${units.heat(proposed.totalW)}` : null}
            data={{
              onceInYears: result.months.map((entry) => units.amount(entry.onceInYearsRequiredW, "power")),
              everyday: result.months.map((entry) => units.amount(entry.everydayRequiredW, "power")),
              installed: units.amount(result.sizing.installedW, "power"),
              proposed: proposed ? units.amount(proposed.totalW, "power") : null,
            }}
          />
        </div>
      </div>
      <section className="mt-3 break-inside-avoid">
        <b>Taken for granted</b>
        <ul className="m-0 list-disc columns-2 gap-5 pl-4">
          {managementSentences(plan.survey, library, units).map((sentence) => (
            <li key={sentence.id}>{sentence.text}</li>
          ))}
        </ul>
      </section>
      <dl className="m-0 mt-3 grid grid-cols-3 break-inside-avoid border-t border-l border-ink">
        {cells.map((cell) => (
          <div key={cell.name} className="border-r border-b border-ink px-2 py-1">
            <dt className="text-xs">{cell.name}</dt>
            <dd className="m-0 font-bold">{cell.value}</dd>
          </div>
        ))}
        <div className="min-h-14 border-r border-b border-ink px-2 py-1">
          <dt className="text-xs">Farmer: approve / decline</dt>
          <dd className="m-0" />
        </div>
        <div className="col-span-2 min-h-14 border-r border-b border-ink px-2 py-1">
          <dt className="text-xs">Signature and date</dt>
          <dd className="m-0" />
        </div>
      </dl>
      <p className="m-0 mt-2 text-xs">
        A calculation, not an installation design. Local codes and licensed trades decide about fuel, flues,
        wiring and alarms.
      </p>
    </div>
  );
}
