import { describe, expect, it } from "vitest";
import { recordOf } from "../record-check.ts";
import { rows, topic } from "./hand-calculated-houses.rows.ts";

describe(topic, () => {
  it.each(rows)("$quantity", (row) => {
    expect(recordOf(topic, row)).toMatchObject({ verdict: "agrees" });
  });
});
