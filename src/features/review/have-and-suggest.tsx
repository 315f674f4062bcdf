import type { PlanView } from "../../../server/contracts/plans.ts";
import type { HeaterOption } from "../../../server/engine/plan/sizing-types.ts";
import { OptionBar, optionScaleW } from "../../components/plan/option-bar.tsx";
import type { Units } from "../../lib/units.ts";

/** Today's heaters as an option, for a bar beside the suggested ones. */
function today(plan: PlanView): Pick<HeaterOption, "units" | "totalW" | "spareW" | "title"> {
  const { sizing } = plan.result;
  const kept = sizing.options.flatMap((option) => option.units).filter((unit) => unit.existing);
  const seen = new Map(kept.map((unit) => [`${unit.label}-${unit.outputW}-${unit.count}`, unit]));
  const listed = [...seen.values()];
  const listedW = listed.reduce((sum, unit) => sum + unit.outputW * unit.count, 0);
  const complete = Math.abs(listedW - sizing.installedW) < 1;
  return {
    title: "What you have",
    totalW: sizing.installedW,
    spareW: sizing.installedW - sizing.onceInYearsRequiredW,
    units: complete
      ? listed
      : sizing.installedW > 0
        ? [{ outputW: sizing.installedW, count: 1, existing: true, label: "" }]
        : [],
  };
}

/** Two bars at one scale with the coldest night through both. */
export function HaveAndSuggest({ plan, advisor, units }: { plan: PlanView; advisor: string; units: Units }) {
  const needW = plan.result.sizing.onceInYearsRequiredW;
  const proposed = plan.result.sizing.options.find((option) => option.id === plan.proposedOptionId);
  const have = today(plan);
  const scaleW = optionScaleW([have, ...(proposed ? [proposed] : [])], needW);
  const needLeft = `${((needW / scaleW) * 100).toFixed(1)}%`;
  return (
    <section aria-label="Heaters against the coldest night" className="max-w-[820px]">
      <p className="m-0 font-bold">{`What you have: ${units.heat(have.totalW)}`}</p>
      <OptionBar option={have} needW={needW} scaleW={scaleW} units={units} height={40} widePx={760} />
      {proposed ? (
        <>
          <p className="m-0 mt-3 font-bold">{`What ${advisor} suggests: ${units.heat(proposed.totalW)}`}</p>
          <OptionBar option={proposed} needW={needW} scaleW={scaleW} units={units} height={40} widePx={760} />
        </>
      ) : null}
      <p className="relative m-0 h-7 text-sm font-bold">
        <span
          className="absolute max-w-full -translate-x-full whitespace-nowrap max-md:static max-md:translate-x-0 md:pr-1"
          style={{ left: needLeft }}
        >
          {`Coldest night: ${units.heat(needW)}`}
        </span>
      </p>
    </section>
  );
}
