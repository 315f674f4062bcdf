import type { PlanResult } from "../../../server/engine/plan/plan-types.ts";
import { monthName, spanRange } from "../../lib/format.ts";
import type { Units } from "../../lib/units.ts";
import { rarity } from "./state-words.ts";

/** How far the fitted heat falls short on the rarer night, W; never negative. */
export function shortW(result: PlanResult): number {
  return Math.max(0, result.sizing.onceInYearsRequiredW - result.sizing.installedW);
}

/** Set-point of the month that governs. */
function governingSetpointC(result: PlanResult): number | undefined {
  return result.months.find((month) => month.month === result.sizing.onceInYearsMonth)?.setpointNightC;
}

/** The answer first, in one or two sentences with the numbers in them. */
export function headline(name: string, result: PlanResult, units: Units): { first: string; second: string } {
  const { sizing } = result;
  const night = `the coldest night ${rarity(result.returnPeriodYears)}`;
  if (sizing.noHeaterReason) return { first: `${name} needs no heater.`, second: sizing.noHeaterReason };
  if (sizing.verdictOnceInYears === "cannotSay") {
    return {
      first: `Whether ${name} holds cannot be said yet.`,
      second: "Answers are missing or do not fit together; see below which.",
    };
  }
  if (sizing.verdictOnceInYears === "notApplicable" || sizing.onceInYearsRequiredW <= 0) {
    return { first: `${name} asks for no heat in any month.`, second: "Nothing has to be fitted." };
  }
  const need = units.heat(sizing.onceInYearsRequiredW);
  const have = units.heat(sizing.installedW);
  const missing = shortW(result);
  if (sizing.installedW <= 0) {
    return {
      first: `${name} needs ${need} on ${night} and has no heater.`,
      second: `Without heat it would fall to about ${units.roundTemperature(sizing.settlesAtOnceInYearsC)}.`,
    };
  }
  if (missing > 0) {
    const everyday =
      sizing.verdictEveryday === "holds"
        ? "On an ordinary cold night it holds."
        : "On an ordinary cold night it does not hold either.";
    return {
      first: `${name} is ${units.heat(missing)} short on ${night}.`,
      second: `${need} is needed in ${monthName(sizing.onceInYearsMonth)} and ${have} is fitted. The house would settle at about ${units.roundTemperature(sizing.settlesAtOnceInYearsC)} and not at ${units.roundTemperature(governingSetpointC(result))}. ${everyday}`,
    };
  }
  const spare = sizing.installedW - sizing.onceInYearsRequiredW;
  return {
    first: `${name} holds on ${night}.`,
    second: `${need} is needed in ${monthName(sizing.onceInYearsMonth)} and ${have} is fitted: ${spare < sizing.onceInYearsRequiredW * 0.05 ? "nothing to spare" : `${units.heat(spare)} to spare`}.`,
  };
}

/** What happens when all heat stops on the rarer night; null where the plan does not say. */
export function failureSentence(result: PlanResult, criticalC: number, units: Units): string | null {
  const { hoursToCriticalLow: low, hoursToCriticalHigh: high } = result.sizing;
  if (low === null || high === null) return null;
  return `If all heating stops on that night, the house reaches ${units.roundTemperature(criticalC)} in ${spanRange(low, high)}.`;
}
