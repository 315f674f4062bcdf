import { requireInRange } from "../errors.ts";
import { massOnDayKg, type SchedulePoint } from "./schedule.ts";

/** Stock as a person gives it. */
export type StockEntry =
  /** So many animals of a mass. */
  | { kind: "mass"; headCount: number; massKg: number }
  /** So many kilograms alive in all. */
  | { kind: "liveMass"; liveMassKg: number; massKg: number }
  /** A batch: placed count, growth curve, day since placing. */
  | {
      kind: "batch";
      placedCount: number;
      curve: readonly SchedulePoint[];
      /** Age on the day of placing: 0 for day-olds. */
      placedAgeDays: number;
      /** Days from placing to leaving. */
      lengthDays: number;
      /** Share lost by the end, spread evenly over the batch. */
      lossFrac: number;
      /** Day since placing; before 0 and after the end the house is empty. */
      day: number;
    };

export interface StockNow {
  headCount: number;
  /** 0 where there is no animal. */
  massKg: number;
}

const EMPTY: StockNow = { headCount: 0, massKg: 0 };

/**
 * Animals in the house and their mass now, from any of the ways stock is given. An empty house holds no animal: a batch gives no
 * heat on clean-out and pre-heating days.
 *
 * Units head, kg, days → head, kg. Valid 0 to 1 000 000 head, loss 0 to 0.5. Errors EngineInputError. Source [GROWTH].
 */
export function stockNow(entry: StockEntry): StockNow {
  if (entry.kind === "mass") {
    requireInRange("headCount", entry.headCount, 0, 1_000_000);
    requireInRange("massKg", entry.massKg, 1e-3, 2000, "kg");
    return entry.headCount === 0 ? EMPTY : { headCount: entry.headCount, massKg: entry.massKg };
  }
  if (entry.kind === "liveMass") {
    requireInRange("liveMassKg", entry.liveMassKg, 0, 1e7, "kg");
    requireInRange("massKg", entry.massKg, 1e-3, 2000, "kg");
    return entry.liveMassKg === 0
      ? EMPTY
      : { headCount: entry.liveMassKg / entry.massKg, massKg: entry.massKg };
  }
  requireInRange("placedCount", entry.placedCount, 0, 1_000_000);
  requireInRange("placedAgeDays", entry.placedAgeDays, 0, 3000, "d");
  requireInRange("lengthDays", entry.lengthDays, 1, 2000, "d");
  requireInRange("lossFrac", entry.lossFrac, 0, 0.5);
  requireInRange("day", entry.day, -1000, 3000, "d");
  if (entry.day < 0 || entry.day > entry.lengthDays || entry.placedCount === 0) return EMPTY;
  return {
    headCount: entry.placedCount * (1 - (entry.lossFrac * entry.day) / entry.lengthDays),
    massKg: massOnDayKg(entry.curve, entry.placedAgeDays + entry.day),
  };
}
