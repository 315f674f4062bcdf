import { EngineInputError, requireInRange } from "../errors.ts";

/** A value at a day of the batch, rising days. */
export type SchedulePoint = readonly [day: number, value: number];

/** Checks a schedule and a day; returns the two points around the day. */
function around(points: readonly SchedulePoint[], day: number): [SchedulePoint, SchedulePoint] {
  requireInRange("day", day, 0, 3000, "d");
  const [first] = points;
  const last = points.at(-1);
  if (first === undefined || last === undefined)
    throw new EngineInputError({
      quantity: "points",
      value: 0,
      reason: "length",
      note: "A schedule needs a point.",
    });
  points.forEach(([at, value], index) => {
    requireInRange("day", at, 0, 3000, "d", index);
    requireInRange("value", value, -1e6, 1e6, "", index);
    const before = points[index - 1];
    if (before !== undefined && at <= before[0])
      throw new EngineInputError({
        quantity: "day",
        value: at,
        reason: "inconsistent",
        unit: "d",
        index,
        note: "The days of a schedule must rise.",
      });
  });
  if (day <= first[0]) return [first, first];
  if (day >= last[0]) return [last, last];
  const next = points.findIndex(([at]) => at > day);
  return [points[next - 1] ?? first, points[next] ?? last];
}

/** Straight between two points. */
function between([left, right]: [SchedulePoint, SchedulePoint], day: number): number {
  if (right[0] === left[0]) return left[1];
  return left[1] + ((day - left[0]) / (right[0] - left[0])) * (right[1] - left[1]);
}

/**
 * Set-point, rate or any other value on a day of the batch, straight between the points. Before the first and after the last
 * point their values hold on.
 *
 * Units days → unit of the points. Valid day 0 to 3000. Errors EngineInputError for an empty schedule or days that do not rise.
 * Source [SETPOINTS] for the typical schedules.
 */
export function scheduleValue(points: readonly SchedulePoint[], day: number): number {
  return between(around(points, day), day);
}

/**
 * Mass of an animal on a day of its life. Between weekly points a straight line is too heavy and an even growth rate too light for
 * young birds, so their geometric mean is taken.
 *
 * Units days, kg → kg. Valid from the first to the last day of the curve; beyond it the mass is not known and EngineInputError says
 * so. Source [GROWTH], typical.
 */
export function massOnDayKg(curve: readonly SchedulePoint[], day: number): number {
  const pair = around(curve, day);
  const firstDay = curve[0]?.[0] ?? 0;
  const lastDay = curve.at(-1)?.[0] ?? 0;
  requireInRange("day", day, firstDay, lastDay, "d");
  const [left, right] = pair;
  requireInRange("massKg", left[1], 1e-3, 2000, "kg");
  requireInRange("massKg", right[1], 1e-3, 2000, "kg");
  if (right[0] === left[0]) return left[1];
  const share = (day - left[0]) / (right[0] - left[0]);
  const evenRate = left[1] * (right[1] / left[1]) ** share;
  return Math.sqrt(between(pair, day) * evenRate);
}

/**
 * Age at which an animal reaches a mass, the inverse of {@link massOnDayKg}.
 *
 * Units kg → days. Valid for masses on a rising curve. Errors EngineInputError. Source [GROWTH], typical.
 */
export function dayOfMass(curve: readonly SchedulePoint[], massKg: number): number {
  let low = curve[0]?.[0] ?? 0;
  let high = curve.at(-1)?.[0] ?? 0;
  requireInRange("massKg", massKg, massOnDayKg(curve, low), massOnDayKg(curve, high), "kg");
  for (let step = 0; step < 60; step += 1) {
    const middle = (low + high) / 2;
    if (massOnDayKg(curve, middle) < massKg) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}
