import type { PlanView } from "../../../server/contracts/plans.ts";
import type { Units } from "../../lib/units.ts";

/** The coldest night in two sentences with the numbers in bold. */
export function NightSentence({ plan, units }: { plan: PlanView; units: Units }) {
  const { sizing, months, returnPeriodYears } = plan.result;
  const coldest = months.find((month) => month.month === sizing.onceInYearsMonth);
  const name = plan.building.name;
  if (sizing.noHeaterReason || sizing.onceInYearsRequiredW <= 0 || !coldest) {
    return <p className="m-0 mt-3 max-w-[62ch]">{sizing.noHeaterReason ?? `${name} asks for no heat.`}</p>;
  }
  const have = sizing.installedW;
  const short = have < sizing.onceInYearsRequiredW - 1;
  const heaters = plan.survey.heaters.length > 1 ? "Your heaters give" : "Your heater gives";
  return (
    <p className="m-0 mt-3 max-w-[62ch]">
      {`On the coldest night we plan for, ${units.temperature(coldest.climate.onceInYearsDesignC)} outside, once in ${returnPeriodYears} years, ${name} needs `}
      <b>{units.heat(sizing.onceInYearsRequiredW)}</b>
      {` to stay at ${units.roundTemperature(coldest.setpointNightC)}. `}
      {have > 0 ? (
        <>
          {`${heaters} `}
          <b>{units.heat(have)}</b>.{" "}
        </>
      ) : (
        "No heater is fitted. "
      )}
      {short ? (
        <>
          {"On a night like that it would fall to about "}
          <b>{units.roundTemperature(sizing.settlesAtOnceInYearsC)}</b>.
        </>
      ) : (
        "That is enough."
      )}
    </p>
  );
}
