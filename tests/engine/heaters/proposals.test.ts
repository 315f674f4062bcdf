import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { EngineInputError } from "../../../server/engine/errors.ts";
import { proposeHeaters } from "../../../server/engine/heaters/propose-heaters.ts";
import {
  equalUnits,
  heaterFamilies,
  smallestUnit,
  unitSizes,
} from "../../../server/engine/heaters/unit-sizes.ts";

const family = fc.constantFrom(...heaterFamilies);
const units = fc.constantFrom("si" as const, "us" as const);
const need = fc.double({ min: 500, max: 2e6, noNaN: true });

describe("sizes of a family", () => {
  it("rise, and the smallest that gives enough is taken", () => {
    fc.assert(
      fc.property(family, units, need, (kind, system, neededW) => {
        const outputs = unitSizes(kind, 0.8, system).map(({ outputW }) => outputW);
        expect(outputs).toEqual([...outputs].sort((a, b) => a - b));
        const { totalW, count, size } = equalUnits(kind, neededW, 0.8, system);
        expect(totalW).toBeGreaterThanOrEqual(neededW - 1e-6);
        const smaller = outputs.filter((outputW) => outputW < size.outputW).at(-1) ?? 0;
        expect(smaller * count).toBeLessThan(neededW);
      }),
    );
  });

  it("end, and say so", () => {
    expect(() => smallestUnit("brooder", 50_000, 0.9, "us")).toThrow(EngineInputError);
    expect(() => smallestUnit("brooder", 50_000, 0.9, "us")).toThrow(/No single unit of this kind/);
  });
});

describe("proposals", () => {
  const base = { marginFrac: 0.15, family: "unitHeater", efficiencyFrac: 0.8, units: "si" } as const;

  it("reach the need with its margin wherever something is bought", () => {
    fc.assert(
      fc.property(
        need,
        fc.array(fc.double({ min: 1000, max: 300_000, noNaN: true }), { maxLength: 4 }),
        family,
        units,
        fc.double({ min: 0.6, max: 1, noNaN: true }),
        (requiredW, existingW, kind, system, altitudeFactor) => {
          const proposals = proposeHeaters({
            ...base,
            requiredW,
            existingW,
            family: kind,
            units: system,
            altitudeFactor,
          });
          for (const one of proposals) {
            if (one.buy.length > 0) expect(one.meetsMargin).toBe(true);
            expect(one.oneOutW).toBeLessThan(one.totalW);
            expect(one.spareFrac).toBeCloseTo(one.totalW / requiredW - 1, 9);
          }
          const two = proposals.find(({ kind: named }) => named === "shareTwo");
          if (two) expect(two.oneOutW).toBeGreaterThanOrEqual(0.6 * requiredW - 1e-6);
        },
      ),
    );
  });

  it("are no heater at all where the animals cover the house", () => {
    const none = proposeHeaters({ ...base, requiredW: -2000, existingW: [] });
    expect(none).toEqual([
      {
        kind: "none",
        buy: [],
        keepsExisting: false,
        totalW: 0,
        spareFrac: null,
        oneOutW: 0,
        oneOutFrac: null,
        meetsNeed: true,
        meetsMargin: true,
      },
    ]);
    expect(proposeHeaters({ ...base, requiredW: 0, existingW: [5000] }).map(({ kind }) => kind)).toEqual([
      "keep",
    ]);
  });

  it("keep enough heat as it is, without adding to it", () => {
    const kinds = proposeHeaters({ ...base, requiredW: 40_000, existingW: [30_000, 30_000] }).map(
      ({ kind }) => kind,
    );
    expect(kinds[0]).toBe("keep");
    expect(kinds).not.toContain("add");
  });

  it("buy more plate for a house on a mountain", () => {
    const sea = proposeHeaters({ ...base, requiredW: 60_000, existingW: [] });
    const high = proposeHeaters({ ...base, requiredW: 60_000, existingW: [], altitudeFactor: 0.7 });
    const plate = (list: typeof sea) => list.find(({ kind }) => kind === "shareTwo")?.buy[0]?.size.plate ?? 0;
    expect(plate(high)).toBeGreaterThan(plate(sea));
  });
});
