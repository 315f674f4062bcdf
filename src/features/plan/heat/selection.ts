import type {
  HouseBalance,
  HouseStateId,
  MonthResult,
  PlanResult,
} from "../../../../server/engine/plan/plan-types.ts";

export type Night = "everyday" | "onceInYears";

/** Which steady hour of a plan is being looked at. It lives in the address, so that a view can be sent to somebody. */
export interface Selection {
  month: number;
  night: Night;
  state: HouseStateId;
}

export const stateOrder: HouseStateId[] = ["screensShut", "screensOpen", "snowOnRoof", "largestUnitOut"];

/** The states that were worked out for a month and night, in fixed order. */
export function statesOf(month: MonthResult, night: Night): HouseStateId[] {
  return stateOrder.filter((state) => month[night][state] !== undefined);
}

function monthOf(result: PlanResult, month: number): MonthResult | undefined {
  return result.months.find((entry) => entry.month === month);
}

/** The state that asks for the most heat among those in which the house is meant to hold. */
function usualState(month: MonthResult, night: Night): HouseStateId {
  return statesOf(month, night)[0] ?? "screensShut";
}

/** Reads the address; whatever is missing or unknown becomes the worst month on the rarer night. */
export function readSelection(params: URLSearchParams, result: PlanResult): Selection {
  const typedMonth = Number(params.get("month"));
  const month =
    monthOf(result, typedMonth) ?? monthOf(result, result.sizing.onceInYearsMonth) ?? result.months[0];
  const night: Night = params.get("night") === "everyday" ? "everyday" : "onceInYears";
  if (!month) return { month: 1, night, state: "screensShut" };
  const wanted = stateOrder.find((state) => state === params.get("state"));
  const state = wanted && month[night][wanted] ? wanted : usualState(month, night);
  return { month: month.month, night, state };
}

/** The balance behind a selection; null where the engine gave none. */
export function selectedBalance(result: PlanResult, selection: Selection): HouseBalance | null {
  return monthOf(result, selection.month)?.[selection.night][selection.state] ?? null;
}

/** Every balance of a plan, for the common scale of the arrows. */
export function allBalances(result: PlanResult): HouseBalance[] {
  return result.months.flatMap((month) =>
    (["everyday", "onceInYears"] as const).flatMap((night) =>
      stateOrder.flatMap((state) => month[night][state] ?? []),
    ),
  );
}
