import type { FuelRecord } from "./fuel-records.ts";

/** Use over a span of days. */
export interface UseSpan {
  fromDay: number;
  toDay: number;
  amount: number;
  /** True where a meter was read at both ends. */
  readAtEnds: boolean;
}

/**
 * Uses from a record: an estimate and the reading that sets it right become one span, a credit is taken from the span it falls
 * into. Duplicates are left out. Lines that overlap otherwise must have been put right before.
 *
 * Units days, any amount. Errors none. Source [BILLSLIPS].
 */
export function settleRecords(records: readonly FuelRecord[]): UseSpan[] {
  const spans: UseSpan[] = [];
  let open: UseSpan | null = null;
  const sorted = records
    .filter(({ kind, fromDay, toDay }) => kind !== "credit" && toDay > fromDay)
    .toSorted((a, b) => a.fromDay - b.fromDay);
  let last: FuelRecord | null = null;
  for (const record of sorted) {
    const repeated =
      last !== null &&
      last.fromDay === record.fromDay &&
      last.toDay === record.toDay &&
      last.amount === record.amount;
    last = record;
    if (repeated) continue;
    const span: UseSpan =
      open === null
        ? { fromDay: record.fromDay, toDay: record.toDay, amount: record.amount, readAtEnds: false }
        : { ...open, toDay: record.toDay, amount: open.amount + record.amount };
    if (record.kind === "estimated") {
      open = span;
    } else {
      spans.push({ ...span, readAtEnds: true });
      open = null;
    }
  }
  if (open !== null) spans.push(open);
  for (const credit of records.filter(({ kind }) => kind === "credit")) {
    const span =
      spans.find(({ fromDay, toDay }) => credit.fromDay >= fromDay && credit.fromDay < toDay) ?? spans.at(-1);
    if (span) span.amount -= Math.abs(credit.amount);
  }
  return spans;
}
