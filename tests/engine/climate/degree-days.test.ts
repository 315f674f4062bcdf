import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  degreeDaysErbs,
  degreeDaysHitchin,
  degreeDaysNormal,
  meanShortfallK,
} from "../../../server/engine/climate/degree-days.ts";
import { normalQuantile, normalShareBelow } from "../../../server/engine/climate/normal-distribution.ts";
import { EngineInputError } from "../../../server/engine/errors.ts";

const temp = fc.double({ min: -40, max: 40, noNaN: true });
const spread = fc.double({ min: 0.2, max: 12, noNaN: true });

describe("normal distribution", () => {
  it("turns a share into z and back", () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-9, max: 1 - 1e-9, noNaN: true }), (share) => {
        expect(normalShareBelow(normalQuantile(share))).toBeCloseTo(share, 11);
      }),
    );
  });

  it("is continuous where the series meets the continued fraction", () => {
    expect(normalShareBelow(-3 + 1e-9) - normalShareBelow(-3 - 1e-9)).toBeLessThan(1e-11);
  });
});

describe("degree-days", () => {
  it("never lie below the plain difference and grow with the base and with the spread", () => {
    fc.assert(
      fc.property(temp, temp, spread, (base, mean, sd) => {
        const value = degreeDaysNormal(base, mean, sd, 30);
        expect(value).toBeGreaterThanOrEqual(30 * Math.max(0, base - mean) - 1e-9);
        expect(degreeDaysNormal(base + 1, mean, sd, 30)).toBeGreaterThanOrEqual(value - 1e-9);
        expect(degreeDaysNormal(base, mean, sd + 1, 30)).toBeGreaterThanOrEqual(value - 1e-9);
      }),
    );
  });

  it("of the three methods agree within a tenth far below the base", () => {
    const plain = 31 * 30;
    for (const value of [
      degreeDaysNormal(20, -10, 5, 31),
      degreeDaysErbs(20, -10, 10, 31),
      degreeDaysHitchin(20, -10, 31),
    ])
      expect(Math.abs(value - plain) / plain).toBeLessThan(0.1);
  });

  it("says which number is outside its range", () => {
    expect(() => meanShortfallK(18, 5, -1)).toThrowError(EngineInputError);
    expect(() => degreeDaysHitchin(18, Number.NaN, 30)).toThrowError(/meanTempC/);
    expect(() => degreeDaysNormal(18, 5, 4, 0)).toThrowError(/days/);
  });
});
