import { requireInRange } from "../errors.ts";

/** A line of a fuel record. Days by their number, `to` being the first day no longer counted. */
export interface FuelRecord {
  fromDay: number;
  toDay: number;
  amount: number;
  /** "read" on the meter, "estimated" by the supplier, or a "credit" that takes back an earlier bill. */
  kind: "read" | "estimated" | "credit";
}

export type RecordFault =
  /** The span ends before it begins. */
  | "backwards"
  /** The span lies after the day of looking. */
  | "future"
  /** Same span and amount as an earlier line. */
  | "duplicate"
  /** Part of the span is already billed. */
  | "overlap"
  /** Days between two lines belong to none. */
  | "gap"
  /** A use below zero that is not a credit. */
  | "negative"
  /** More than four months in one line: months cannot be told apart. */
  | "longSpan"
  /** Estimated, and no later reading to set it right. */
  | "unsettledEstimate"
  /** A day's use more than eight times the usual: a factor of ten or a lost decimal point. */
  | "outlier";

export interface FoundFault {
  index: number;
  fault: RecordFault;
  /** Faults that must be put right before anything is reckoned. */
  blocking: boolean;
}

const BLOCKING: readonly RecordFault[] = [
  "backwards",
  "future",
  "duplicate",
  "overlap",
  "negative",
  "outlier",
];
const LONG_SPAN_DAYS = 125;
const OUTLIER_FACTOR = 8;

/**
 * What is wrong with a fuel record, line by line. Nothing is changed: each fault has to be answered.
 *
 * Units days. Valid up to 5000 lines. Errors EngineInputError. Source [BILLSLIPS].
 */
export function recordFaults(records: readonly FuelRecord[], todayDay: number): FoundFault[] {
  requireInRange("records", records.length, 0, 5000);
  const found: FoundFault[] = [];
  const note = (index: number, fault: RecordFault) => {
    found.push({ index, fault, blocking: BLOCKING.includes(fault) });
  };
  const usual = usualPerDay(records);
  records.forEach((record, index) => {
    requireInRange("amount", record.amount, -1e12, 1e12, "", index);
    requireInRange("fromDay", record.fromDay, -30_000, 100_000, "d", index);
    requireInRange("toDay", record.toDay, -30_000, 100_000, "d", index);
    if (record.toDay <= record.fromDay) note(index, "backwards");
    else if (record.fromDay > todayDay || record.toDay > todayDay + 1) note(index, "future");
    if (record.kind !== "credit") {
      if (record.amount < 0) note(index, "negative");
      const perDay = record.amount / Math.max(1, record.toDay - record.fromDay);
      if (usual > 0 && perDay > OUTLIER_FACTOR * usual) note(index, "outlier");
    }
    if (record.toDay - record.fromDay > LONG_SPAN_DAYS) note(index, "longSpan");
  });
  noteNeighbours(records, note);
  return found.sort((a, b) => a.index - b.index);
}

/** Median of a day's use: one wild line does not move it. */
function usualPerDay(records: readonly FuelRecord[]): number {
  const perDay = records
    .filter(({ kind, fromDay, toDay, amount }) => kind !== "credit" && toDay > fromDay && amount > 0)
    .map(({ fromDay, toDay, amount }) => amount / (toDay - fromDay))
    .sort((a, b) => a - b);
  return perDay[Math.floor(perDay.length / 2)] ?? 0;
}

/** Faults that show only beside the other lines. */
function noteNeighbours(
  records: readonly FuelRecord[],
  note: (index: number, fault: RecordFault) => void,
): void {
  const inOrder = records
    .map((record, index) => ({ record, index }))
    .filter(({ record }) => record.kind !== "credit" && record.toDay > record.fromDay)
    .sort((a, b) => a.record.fromDay - b.record.fromDay || a.index - b.index);
  inOrder.forEach(({ record, index }, place) => {
    const before = inOrder[place - 1]?.record;
    if (before) {
      const same =
        before.fromDay === record.fromDay && before.toDay === record.toDay && before.amount === record.amount;
      if (same) note(index, "duplicate");
      else if (record.fromDay < before.toDay) note(index, "overlap");
      else if (record.fromDay > before.toDay) note(index, "gap");
    }
    const settled = inOrder.slice(place + 1).some((later) => later.record.kind === "read");
    if (record.kind === "estimated" && !settled) note(index, "unsettledEstimate");
  });
}
