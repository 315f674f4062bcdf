import type { PlanView } from "../../../../server/contracts/plans.ts";
import { failureSentence } from "../../../components/plan/plan-sentences.ts";
import { verdictWords } from "../../../components/plan/state-words.ts";
import { number, spanRange } from "../../../lib/format.ts";
import { quantitySi } from "../../../lib/quantity-value.ts";
import type { Units } from "../../../lib/units.ts";

interface Fact {
  name: string;
  value: string;
}

function facts(plan: PlanView, units: Units): Fact[] {
  const { sizing, annual } = plan.result;
  const { hoursToCriticalLow: low, hoursToCriticalHigh: high } = sizing;
  return [
    {
      name: "Ordinary cold night",
      value: `${verdictWords[sizing.verdictEveryday]}, ${units.heat(sizing.everydayRequiredW)} needed`,
    },
    ...(sizing.installedW > 0
      ? [
          {
            name: "Largest fitted heater out, house settles at",
            value: units.temperature(sizing.largestUnitOutSettlesAtC),
          },
        ]
      : []),
    {
      name: "All heat stops, time to the critical temperature",
      value: low === null || high === null ? "not reached or not known" : spanRange(low, high),
    },
    {
      name: "Heat in a normal year",
      value: `${units.energy(annual.heaterKwh)}, ${units.text(annual.heaterKwhM2, "energyPerArea", { decimals: 0 })}`,
    },
    { name: "Fuel in a normal year", value: `${number(annual.fuelAmount)}\u00a0${annual.fuelUnit}` },
    { name: "Carbon dioxide from it", value: units.text(annual.carbonDioxideKg, "mass", { decimals: 0 }) },
    ...(sizing.noHeaterReason === null
      ? [{ name: "Buy for, with margin", value: units.heat(sizing.targetW) }]
      : []),
  ];
}

/** What follows from today's heaters: nights, failure, fuel. */
export function SizingFacts({ plan, units }: { plan: PlanView; units: Units }) {
  const failure = failureSentence(plan.result, quantitySi(plan.survey.criticalTemp), units);
  return (
    <section aria-labelledby="facts-heading">
      <h2 id="facts-heading" className="m-0 font-sign text-lg font-bold">
        {plan.result.sizing.installedW > 0 ? "With what is fitted now" : "As it is, without a heater"}
      </h2>
      {failure ? <p className="m-0 mt-1 text-sm">{failure}</p> : null}
      <dl className="m-0 mt-1 text-sm">
        {facts(plan, units).map((fact) => (
          <div key={fact.name} className="flex flex-wrap justify-between gap-x-4 border-b border-rule py-2">
            <dt>{fact.name}</dt>
            <dd className="m-0 font-bold">{fact.value}</dd>
          </div>
        ))}
      </dl>
    </section>
  );
}
