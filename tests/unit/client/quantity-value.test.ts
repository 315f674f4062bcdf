import fc from "fast-check";
import { describe, expect, test } from "vitest";
import type { Quantity } from "../../../server/contracts/quantity.ts";
import { shownQuantity } from "../../../src/components/form/shown-quantity.ts";
import { stepped } from "../../../src/components/form/stepping.ts";
import { inUnit, quantitySi } from "../../../src/lib/quantity-value.ts";

const quantity = (
  typed: string,
  unit: Quantity["unit"],
  origin: Quantity["origin"] = "measured",
): Quantity => ({
  typed,
  unit,
  origin,
});

describe("a quantity as it was typed", () => {
  test("reads the true minus and refuses an empty figure", () => {
    expect(quantitySi(quantity("\u22125", "C"))).toBe(-5);
    expect(quantitySi(quantity(" ", "m"))).toBeNaN();
  });

  test("switching the unit there and back keeps the measure within four digits", () => {
    fc.assert(
      fc.property(fc.double({ min: 0.5, max: 900, noNaN: true }), (metres) => {
        const start = quantity(metres.toFixed(2), "m");
        const back = inUnit(inUnit(start, "ft"), "m");
        expect(quantitySi(back)).toBeCloseTo(quantitySi(start), metres < 10 ? 2 : metres < 100 ? 1 : 0);
      }),
    );
  });

  test("a unit of another kind changes nothing but the unit, so that the contract can refuse it", () => {
    expect(inUnit(quantity("5", "m"), "kg").typed).toBe("5");
  });
});

describe("a quantity as it is shown", () => {
  test("a measured figure stays in the unit it was typed in", () => {
    expect(shownQuantity(quantity("30", "ft"), "si")).toEqual(quantity("30", "ft"));
  });

  test("a typical value is shown in the reader's own unit", () => {
    expect(shownQuantity(quantity("9", "m", "default"), "us")).toEqual(quantity("29.53", "ft", "default"));
    expect(shownQuantity(quantity("9", "m", "default"), "si")).toEqual(quantity("9", "m", "default"));
  });

  test("a share is shown in percent", () => {
    expect(shownQuantity(quantity("0.85", "share"), "si")).toEqual(quantity("85", "percent"));
  });
});

describe("one step with plus or minus", () => {
  test("adds the unit's step and keeps the decimals that were typed", () => {
    expect(stepped("4.7", "m", 1)).toBe("4.8");
    expect(stepped("36", "m", -1)).toBe("35.9");
    expect(stepped("14", "C", 1)).toBe("15");
    expect(stepped("0.46", "m", 1)).toBe("0.56");
  });

  test("counts step in whole animals, more at a time in large flocks", () => {
    expect(stepped("3", "each", 1)).toBe("4");
    expect(stepped("38000", "each", 1)).toBe("39000");
  });

  test("leaves alone what is not a number", () => {
    expect(stepped("", "m", 1)).toBe("");
    expect(stepped("abc", "m", 1)).toBe("abc");
  });

  test("up and down again is where it started", () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 5000 }), (tenths) => {
        const start = (tenths / 10).toFixed(1);
        expect(Number(stepped(stepped(start, "m", 1), "m", -1))).toBeCloseTo(Number(start), 6);
      }),
    );
  });
});
