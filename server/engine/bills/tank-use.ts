import { EngineInputError, requireInRange } from "../errors.ts";
import type { UseSpan } from "./settle-records.ts";

/** Fuel brought on a day. */
export interface Delivery {
  day: number;
  amount: number;
}

/** What the tank held on a day, before any delivery of that day. */
export interface TankLevel {
  day: number;
  amount: number;
}

/**
 * Use between level readings of a tank: what was there, and what was brought, less what is left. Deliveries are not use.
 *
 * Units days, any amount. Valid 2 or more levels. A use below zero throws EngineInputError: a delivery or a level is missing.
 * Source [BILLSLIPS].
 */
export function useBetweenLevels(levels: readonly TankLevel[], deliveries: readonly Delivery[]): UseSpan[] {
  requireInRange("levels", levels.length, 2, 5000);
  const sorted = levels.toSorted((a, b) => a.day - b.day);
  return sorted.slice(1).map((level, index) => {
    const before = sorted[index] ?? level;
    const brought = deliveries
      .filter(({ day }) => day >= before.day && day < level.day)
      .reduce((sum, { amount }) => sum + requireInRange("delivery", amount, 0, 1e9), 0);
    const amount = before.amount + brought - level.amount;
    if (amount < 0)
      throw new EngineInputError({
        quantity: "level",
        value: level.amount,
        reason: "inconsistent",
        index: index + 1,
        note: "The tank holds more than it had and got: a delivery or a level is missing.",
      });
    return { fromDay: before.day, toDay: level.day, amount, readAtEnds: true };
  });
}

/**
 * Use between fills of a tank that is always filled to the same mark: each fill makes up what was used since the one before. The
 * first fill says nothing and is left out.
 *
 * Units days, any amount. Valid 2 or more deliveries on different days. Errors EngineInputError. Source [FELS1986].
 */
export function useBetweenFills(deliveries: readonly Delivery[]): UseSpan[] {
  requireInRange("deliveries", deliveries.length, 2, 5000);
  const sorted = deliveries.toSorted((a, b) => a.day - b.day);
  return sorted.slice(1).map((fill, index) => {
    const fromDay = sorted[index]?.day ?? fill.day;
    requireInRange("day", fill.day, fromDay + 1, 1e6, "d", index + 1);
    return {
      fromDay,
      toDay: fill.day,
      amount: requireInRange("delivery", fill.amount, 0, 1e9, "", index + 1),
      readAtEnds: false,
    };
  });
}

/**
 * Uses shared out to the days they cover, by a weight for each day such as its degree-days, and summed to groups such as months.
 * A span whose days all weigh nothing is shared evenly.
 *
 * Units days, any amount → amount for each group. Valid spans up to 1500 days. Errors EngineInputError. Source [FELS1986].
 */
export function shareOut<Group extends string | number>(
  spans: readonly UseSpan[],
  groupOf: (day: number) => Group,
  weightOf: (day: number) => number,
): Map<Group, number> {
  const sums = new Map<Group, number>();
  spans.forEach(({ fromDay, toDay, amount }, index) => {
    const length = requireInRange("span", toDay - fromDay, 1, 1500, "d", index);
    const days = Array.from({ length }, (_, offset) => fromDay + offset);
    const weights = days.map((day) => requireInRange("weight", weightOf(day), 0, 1e6, "", index));
    const total = weights.reduce((sum, weight) => sum + weight, 0);
    days.forEach((day, place) => {
      const share = total > 0 ? (weights[place] ?? 0) / total : 1 / length;
      const group = groupOf(day);
      sums.set(group, (sums.get(group) ?? 0) + share * amount);
    });
  });
  return sums;
}
