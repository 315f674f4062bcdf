import { describe, expect, it } from "vitest";
import { type CheckRow, recordOf } from "./record-check.ts";

/** Every row of a topic as a test of its own. */
export function describeRows(topic: string, rows: CheckRow[]): void {
  describe(topic, () => {
    it.each(rows)("$quantity", (row) => {
      expect(recordOf(topic, row)).toMatchObject({ verdict: "agrees" });
    });
  });
}
