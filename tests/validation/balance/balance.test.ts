import { describe, expect, it } from "vitest";
import { recordOf } from "../record-check.ts";
import { rows, topic } from "./balance.rows.ts";

describe(topic, () => {
  it.each(rows)("$quantity", (row) => {
    expect(recordOf(topic, row)).toMatchObject({ verdict: "agrees" });
  });
});
