import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type Quantity, quantityProblem, siValue } from "../../../server/contracts/quantity.ts";
import { displayUnits, fromSi, toSi, type UnitId, units } from "../../../server/engine/units.ts";

const unit = fc.constantFrom(...(Object.keys(units) as UnitId[]));

describe("units", () => {
  it("come back from SI to what was typed", () => {
    fc.assert(
      fc.property(unit, fc.double({ min: -1e5, max: 1e5, noNaN: true }), (id, value) => {
        expect(fromSi(toSi(value, id), id)).toBeCloseTo(value, 6);
      }),
    );
  });

  it.each([
    ["60 °F", 60, "F", 15.5556],
    ["a step of 18 °F", 18, "Fdiff", 10],
    ["1 Btu/(h ft² °F)", 1, "BtuHFt2F", 5.678263],
    ["1 Btu/(h ft °F)", 1, "BtuHFtF", 1.730735],
    ["100 kBtu/h", 100, "kBtuH", 29_307.1],
    ["1 therm", 1, "therm", 29.3071],
    ["1 cfm", 1, "cfm", 1.69901],
    ["R-20", 20, "hFt2FBtu", 3.5223],
  ] as const)("%s", (_name, value, id, expected) => {
    // Source of the expected figures: NIST SP 811 appendix B.8 (from memory), to the printed digits.
    expect(toSi(value, id) / expected).toBeCloseTo(1, 4);
  });

  it("are shown in a unit of their own kind in both systems", () => {
    for (const system of [displayUnits.si, displayUnits.us]) {
      for (const [kind, id] of Object.entries(system)) expect(units[id].kind).toBe(kind);
    }
  });
});

describe("a typed quantity", () => {
  const length = { label: "Length", kind: "length", min: 2, max: 1000 } as const;
  const typed = (text: string, id: UnitId = "ft"): Quantity => ({
    typed: text,
    unit: id,
    origin: "measured",
  });

  it("names field, value and range in the typed unit", () => {
    expect(quantityProblem(typed("5"), length)).toBe(
      "Length must lie between 6.562 ft and 3281 ft. You typed 5 ft.",
    );
    expect(quantityProblem(typed("30", "m"), length)).toBeNull();
    expect(quantityProblem(typed("1,234"), length)).toMatch(/must be a number with a point/);
    expect(quantityProblem(typed("30", "C"), length)).toMatch(/cannot be given in °C/);
    expect(
      quantityProblem(typed("2.5", "each"), { label: "Spans", kind: "count", min: 1, max: 9, whole: true }),
    ).toMatch(/whole number/);
  });

  it("reads a typographic minus", () => {
    expect(siValue({ typed: "−5", unit: "C", origin: "guess" })).toBe(-5);
  });
});
