import { describe, expect, test } from "vitest";
import { degreesProblem, degreesText, parseDegrees, parsePair } from "../../../src/lib/coordinates.ts";

describe("typed degrees", () => {
  test.each([
    ["53.36", 53.36],
    ["-7.48", -7.48],
    ["−7.48", -7.48],
    ["7.48 W", -7.48],
    ["S 41.2", -41.2],
    ["41,2 S", -41.2],
    ["172.6° E", 172.6],
  ])("%s", (text, value) => {
    expect(parseDegrees(text)).toBe(value);
  });

  test.each(["", "north", "53° 21' 30\"", "1e5", "4.1 O"])("%s is no decimal degree", (text) => {
    expect(parseDegrees(text)).toBeNull();
  });

  test("a problem is a sentence, and names the usual slip", () => {
    expect(degreesProblem("153", "latitude")).toMatch(/between −90° and 90°.*swapped/);
    expect(degreesProblem("200", "longitude")).toMatch(/between −180° and 180°/);
    expect(degreesProblem("4.2 E", "latitude")).toMatch(/swapped/);
    expect(degreesProblem("53° 21'", "latitude")).toMatch(/decimal degrees/);
    expect(degreesProblem("", "latitude")).toBeNull();
    expect(degreesProblem("53.3", "latitude")).toBeNull();
  });
});

describe("a pair pasted at once", () => {
  const dublin = { latitudeDeg: 53.36, longitudeDeg: -7.48 };
  test.each([
    "53.36, -7.48",
    "53.36;-7.48",
    "53.36 -7.48",
    "53.36 N, 7.48 W",
    "7.48 W 53.36 N",
    "N 53.36 W 7.48",
  ])("%s", (text) => {
    expect(parsePair(text)).toEqual(dublin);
  });

  test.each(["53.36", "153, 20", "53.36 N, 7.48 N", "53.36, 7.48, 2", "about 53, 7"])(
    "%s is no pair",
    (text) => {
      expect(parsePair(text)).toBeNull();
    },
  );
});

test("degrees are written with their half of the world", () => {
  expect(degreesText(-41.2, "latitude", 1)).toBe("41.2° S");
  expect(degreesText(7.5, "longitude", 2)).toBe("7.50° E");
});
