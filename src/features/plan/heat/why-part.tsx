import type { HouseBalance, PlanResult } from "../../../../server/engine/plan/plan-types.ts";
import { AssumptionRows } from "../../../components/plan/assumption-rows.tsx";
import type { HeatPath } from "../../../components/section-drawing/heat-paths.ts";
import type { Units } from "../../../lib/units.ts";
import { assumptionsFor, whyFlow } from "./why-words.ts";

interface WhyPartProps {
  path: HeatPath;
  balance: HouseBalance;
  result: PlanResult;
  units: Units;
}

/** A number opened: the method in words, what went in, and where each answer came from. */
export function WhyPart({ path, balance, result, units }: WhyPartProps) {
  const why = whyFlow(path, balance, units);
  const rests = assumptionsFor(why, result);
  return (
    <div className="grid gap-3 text-sm whitespace-normal">
      <p className="m-0 max-w-[62ch]">{why.method}</p>
      {why.parts.length > 0 ? (
        <dl className="m-0 grid grid-cols-[auto_1fr] gap-x-4 gap-y-1">
          {why.parts.map((part) => (
            <div key={part.name} className="contents">
              <dt className="text-ink-2">{part.name}</dt>
              <dd className="m-0 font-semibold">{part.value}</dd>
            </div>
          ))}
        </dl>
      ) : null}
      {rests.length > 0 ? (
        <div>
          <h3 className="m-0 text-sm font-bold">It rests on these answers</h3>
          <AssumptionRows assumptions={rests} units={units} />
        </div>
      ) : null}
    </div>
  );
}
