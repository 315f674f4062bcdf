import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { EngineInputError } from "../../../server/engine/errors.ts";
import { altitudeFactor, deliveredOutputW } from "../../../server/engine/heaters/delivered-output.ts";
import { heaterCandidates, withoutLargestW } from "../../../server/engine/heaters/heater-candidates.ts";
import { nextStepW, outputStepsW } from "../../../server/engine/heaters/size-steps.ts";
import { unventedBurner } from "../../../server/engine/heaters/unvented.ts";

const existing = (outputW: number) =>
  outputW > 0 ? [{ outputW, count: 1, existing: true, label: "Old" }] : [];

describe("heaters", () => {
  it("give no more in thinner air", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 5000, noNaN: true }),
        fc.double({ min: 0, max: 900, noNaN: true }),
        (altitude, higher) => {
          expect(altitudeFactor(altitude + higher)).toBeLessThanOrEqual(altitudeFactor(altitude));
        },
      ),
    );
  });

  it("that burn nothing lose nothing in thin air", () => {
    const plate = { ratedW: 5000, basis: "output", efficiencyFrac: 1, altitudeM: 3000 } as const;
    expect(deliveredOutputW({ ...plate, burnsFuel: false })).toBe(5000);
    expect(deliveredOutputW({ ...plate, burnsFuel: true })).toBeLessThan(5000);
  });

  it("come in rising steps that always reach the need", () => {
    expect([...outputStepsW]).toEqual([...outputStepsW].sort((a, b) => a - b));
    fc.assert(
      fc.property(fc.double({ min: 0, max: 2e7, noNaN: true }), (needed) => {
        expect(nextStepW(needed)).toBeGreaterThanOrEqual(needed);
      }),
    );
  });

  it("are proposed so that every new fitting reaches the target", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 500, max: 5e6, noNaN: true }),
        fc.double({ min: 0, max: 5e6, noNaN: true }),
        (target, have) => {
          const candidates = heaterCandidates(target, existing(have));
          expect(new Set(candidates.map(({ id }) => id)).size).toBe(candidates.length);
          for (const { id, totalW, units } of candidates) {
            if (id !== "keep") expect(totalW).toBeGreaterThanOrEqual(target - 1e-6);
            expect(withoutLargestW(units)).toBeLessThan(totalW);
          }
          const two = candidates.find(({ id }) => id === "two");
          expect(withoutLargestW(two?.units ?? [])).toBeGreaterThanOrEqual(0.6 * target - 1e-6);
        },
      ),
    );
  });

  it("are not proposed where none is needed", () => {
    expect(heaterCandidates(0, [])).toEqual([]);
  });

  it("without a flue that cannot hold the room say so", () => {
    const input = {
      missingHeatW: 1000,
      sensibleFrac: 0.92,
      airPerKwM3H: 46,
      airHeatWhM3K: 0.33,
      insideTempC: 32,
      outdoorTempC: -40,
    };
    expect(() => unventedBurner(input)).toThrow(EngineInputError);
    expect(() => unventedBurner(input)).toThrow(/takes more heat than the burner gives/);
  });
});
