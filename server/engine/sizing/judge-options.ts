import { heaterCandidates, withoutLargestW } from "../heaters/heater-candidates.ts";
import type { HeaterOption, HeaterUnit } from "../plan/sizing-types.ts";

/** What an option is judged by. */
export interface OptionJudge {
  everydayRequiredW: number;
  onceInYearsRequiredW: number;
  targetW: number;
  criticalTempC: number;
  setpointC: number;
  existing: HeaterUnit[];
  /** Where the house settles on the once-in-N-years night with so much heat. */
  settlesWithC(heatW: number): number;
}

/**
 * Sensible ways to fit the house, each judged: does it hold both nights, and what happens with its largest unit out.
 * Shape: judge → options, what is there today first. Source [SIZE-STEPS] through the heater functions.
 */
export function judgedOptions(judge: OptionJudge): HeaterOption[] {
  return heaterCandidates(judge.targetW, judge.existing).map((candidate) => {
    const spareW = candidate.totalW - judge.onceInYearsRequiredW;
    const holdsEveryday = candidate.totalW >= judge.everydayRequiredW;
    const holdsOnceInYears = spareW >= 0;
    const leftC = judge.settlesWithC(withoutLargestW(candidate.units));
    const aboveCritical = leftC >= judge.criticalTempC;
    return {
      ...candidate,
      spareW,
      holdsEveryday,
      holdsOnceInYears,
      largestUnitOutSettlesAtC: leftC,
      largestUnitOutAboveCritical: aboveCritical,
      note: optionNote(holdsEveryday, holdsOnceInYears, aboveCritical, unitCount(candidate.units)),
    };
  });
}

const unitCount = (units: readonly HeaterUnit[]) => units.reduce((sum, unit) => sum + unit.count, 0);

function optionNote(everyday: boolean, rare: boolean, aboveCritical: boolean, units: number): string {
  const holds = rare
    ? "Holds both nights."
    : everyday
      ? "Holds the ordinary cold night, not the rare one."
      : "Holds neither night.";
  const out = aboveCritical
    ? "With its largest heater out the house stays above the critical temperature."
    : units === 1
      ? "There is nothing to fall back on when it fails."
      : "With its largest heater out the house falls below the critical temperature.";
  return `${holds} ${out}`;
}
