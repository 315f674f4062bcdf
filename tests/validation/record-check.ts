/** One published figure beside the engine's own. */
export interface CheckRow {
  quantity: string;
  /** Author, year, table or example, or "from memory". */
  source: string;
  computed: number;
  expected: number;
  /** Absolute, in the unit of the figure: the printed digits, or a stated share of it. */
  tolerance: number;
  /** Why a figure may differ, where it does. */
  remark?: string;
}

export interface CheckRecord extends CheckRow {
  topic: string;
  verdict: "agrees" | "differs";
}

/** Half of the last printed digit, for figures given to so many decimals. */
export function digits(decimals: number): number {
  return 0.51 * 10 ** -decimals;
}

/** A share of the figure. */
export function within(expected: number, share: number): number {
  return Math.abs(expected) * share;
}

export function recordOf(topic: string, row: CheckRow): CheckRecord {
  const agrees = Math.abs(row.computed - row.expected) <= row.tolerance;
  return { topic, ...row, verdict: agrees ? "agrees" : "differs" };
}
