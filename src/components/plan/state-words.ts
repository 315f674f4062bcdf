import type { HoldVerdict, HouseStateId } from "../../../server/engine/plan/plan-types.ts";

/** States of a house in words; a house without screens has no word for them. */
export function stateWords(state: HouseStateId, hasScreen: boolean): string {
  switch (state) {
    case "screensShut":
      return hasScreen ? "Screens shut" : "As usual";
    case "screensOpen":
      return "Screens open";
    case "snowOnRoof":
      return "Snow on the roof";
    case "largestUnitOut":
      return "Largest heater out";
  }
}

/** The answer to "does it hold?" in two or three words. */
export const verdictWords: Record<HoldVerdict, string> = {
  holds: "Holds",
  belowSetpoint: "Below the wanted temperature",
  belowCritical: "Below the critical temperature",
  cannotSay: "Cannot be said",
  notApplicable: "No heating wanted",
};

/** "once in 20 years" */
export function rarity(years: number): string {
  return `once in ${years} years`;
}
