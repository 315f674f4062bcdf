import fc from "fast-check";
import { describe, expect, test } from "vitest";
import * as format from "../../../src/lib/format.ts";

const space = "\u00a0";
const minus = "\u2212";

describe("numbers", () => {
  test("a minus is the true minus sign and a rounded zero has none", () => {
    expect(format.number(-8.24, 1)).toBe(`${minus}8.2`);
    expect(format.number(-0.04, 1)).toBe("0.0");
  });

  test("a missing number is a dash and never a zero", () => {
    expect(format.number(null)).toBe("\u2013");
    expect(format.number(Number.NaN, 1)).toBe("\u2013");
    expect(format.text(undefined, "power", "si")).toBe("\u2013");
  });

  test("thousands take a comma", () => {
    expect(format.number(1234567.8, 1)).toBe("1,234,567.8");
  });

  test("no character is used that the bundled face lacks", () => {
    fc.assert(
      fc.property(
        fc.double({ min: -1e7, max: 1e7, noNaN: true }),
        fc.integer({ min: 0, max: 3 }),
        (value, decimals) => {
          expect(format.number(value, decimals)).toMatch(/^[\u2212\d.,]+$/);
        },
      ),
    );
  });
});

describe("units at the edge", () => {
  test("the same heat in both systems", () => {
    expect(format.heat(63_800, "si")).toBe(`64${space}kW`);
    expect(format.heat(63_800, "us")).toBe(`218${space}kBtu/h`);
    expect(format.heat(4_300, "si")).toBe(`4.3${space}kW`);
  });

  test("a temperature is moved by 32, a difference is not", () => {
    expect(format.roundTemperature(-8.5, "us")).toBe(`17${space}°F`);
    expect(format.text(5, "temperatureDifference", "us")).toBe(`9.0${space}°F`);
  });

  test("a length keeps only the decimals it has", () => {
    expect(format.lengthText(4.7, "si")).toBe(`4.7${space}m`);
    expect(format.lengthText(4.75, "si")).toBe(`4.75${space}m`);
    expect(format.lengthText(4.7, "us")).toBe(`15.4${space}ft`);
  });

  test("a year's heat is written in MWh once it is large", () => {
    expect(format.energy(99_018, "si")).toBe(`99.0${space}MWh`);
    expect(format.energy(820, "si")).toBe(`820${space}kWh`);
  });

  test("unit and number part for a smaller unit, degrees and percent stand close", () => {
    expect(format.figure(63_800, "power", "si", { decimals: 1 })).toEqual({ value: "63.8", unit: "kW" });
    expect(format.text(45, "angle", "si")).toBe("45°");
  });
});

describe("times", () => {
  test("hours become hours and minutes in steps of five", () => {
    expect(format.span(1.3)).toBe(`1${space}h 20${space}min`);
    expect(format.span(0.9)).toBe(`55${space}min`);
    expect(format.span(14.2)).toBe(`14${space}h`);
  });

  test("a range that rounds to one figure is said as about", () => {
    expect(format.spanRange(1.0, 1.02)).toBe(`about 1${space}h`);
    expect(format.spanRange(0.6, 1.7)).toBe(`35${space}min to 1${space}h 40${space}min`);
  });

  test("a date of another year carries the year", () => {
    const now = new Date(2026, 10, 30);
    expect(format.day(new Date(2026, 10, 24, 12).toISOString(), now)).toBe("24 Nov");
    expect(format.day(new Date(2025, 0, 2, 12).toISOString(), now)).toBe("2 Jan 2025");
  });

  test("an unreadable date is a dash", () => {
    expect(format.day("soon")).toBe("\u2013");
    expect(format.clock("")).toBe("\u2013");
  });
});

describe("words", () => {
  test("one and many", () => {
    expect(format.counted(1, "change")).toBe("1 change");
    expect(format.counted(3, "change")).toBe("3 changes");
  });

  test("a bearing as a compass word, whatever the turn", () => {
    expect(format.compass(0)).toBe("N");
    expect(format.compass(348)).toBe("NNW");
    expect(format.compass(-90)).toBe("W");
    expect(format.compass(450)).toBe("E");
  });
});
