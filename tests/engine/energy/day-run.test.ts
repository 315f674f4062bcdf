import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type RoomHour, runTypicalDay } from "../../../server/engine/energy/day-run.ts";
import { parabolaAt, parabolaThrough } from "../../../server/engine/energy/parabola.ts";

const mass = { capacityJK: 6e7, couplingWK: 1600 };

function hours(outdoorC: number, change: (hour: number) => Partial<RoomHour> = () => ({})): RoomHour[] {
  return Array.from({ length: 24 }, (_, hour) => ({
    lossAtReferenceW: 1900 * (16 - outdoorC),
    lossPerInsideWK: 1900,
    referenceC: 16,
    gainAirW: 0,
    gainMassW: 0,
    setpointC: 16,
    ventAtC: 19,
    ...change(hour),
  }));
}

describe("a typical day", () => {
  it("without sun needs loss times hours, mass or no mass", () => {
    const results = runTypicalDay(hours(-4), mass, Number.POSITIVE_INFINITY);
    for (const result of results) expect(result.heaterW).toBeCloseTo(1900 * 20, 0);
  });

  it("repeats itself and keeps its energy: gains and heat equal loss and what is let out", () => {
    fc.assert(
      fc.property(
        fc.double({ min: -15, max: 22, noNaN: true }),
        fc.double({ min: 0, max: 60_000, noNaN: true }),
        (outdoorC, noonW) => {
          const day = hours(outdoorC, (hour) => {
            const sunW = Math.max(0, Math.sin(((hour - 6) / 12) * Math.PI)) * noonW;
            return { gainAirW: sunW / 2, gainMassW: sunW / 2 };
          });
          const results = runTypicalDay(day, mass, Number.POSITIVE_INFINITY);
          let balance = 0;
          let size = 1;
          results.forEach((result, index) => {
            const hour = day[index]!;
            const lossW =
              hour.lossAtReferenceW + hour.lossPerInsideWK * (result.insideTempC - hour.referenceC);
            const gainW = hour.gainAirW + hour.gainMassW + result.heaterW;
            expect(lossW + result.storedW + result.ventedW - gainW).toBeCloseTo(0, 5);
            balance += result.storedW;
            size += Math.abs(lossW) + gainW;
          });
          expect(Math.abs(balance) / size).toBeLessThan(0.01);
        },
      ),
      { numRuns: 60 },
    );
  });

  it("never gives more than the heater has, and then falls below the set-point", () => {
    const results = runTypicalDay(hours(-20), mass, 40_000);
    for (const result of results) {
      expect(result.heaterW).toBeLessThanOrEqual(40_000);
      expect(result.insideTempC).toBeLessThan(16);
    }
    // With 40 kW over 1,900 W/K the house ends 21.05 K above the outside.
    expect(results[23]!.insideTempC).toBeCloseTo(-20 + 40_000 / 1900, 1);
  });

  it("carries some of the noon sun into the evening", () => {
    const sunny = (share: number) =>
      runTypicalDay(
        hours(8, (hour) => (hour >= 10 && hour < 15 ? { gainMassW: 40_000 } : {})),
        { ...mass, capacityJK: mass.capacityJK * share },
        Number.POSITIVE_INFINITY,
      );
    expect(sunny(1)[17]!.heaterW).toBeLessThan(1900 * 8);
    expect(sunny(1)[3]!.heaterW).toBeLessThan(1900 * 8);
  });
});

describe("a parabola", () => {
  it("passes through its three points and is exact for a parabola", () => {
    fc.assert(
      fc.property(fc.double({ min: -5, max: 5, noNaN: true }), (c) => {
        const f = (x: number) => 3 - 2 * x + c * x * x;
        const curve = parabolaThrough([-4, 1, 7], [f(-4), f(1), f(7)]);
        for (const x of [-4, 0, 1, 5, 7]) expect(parabolaAt(curve, x)).toBeCloseTo(f(x), 9);
      }),
    );
  });
});
