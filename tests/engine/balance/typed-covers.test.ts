import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { airHeatWK } from "../../../server/engine/balance/air-heat.ts";
import { ceilingFlux } from "../../../server/engine/balance/attic.ts";
import { findZero } from "../../../server/engine/balance/find-zero.ts";
import { typedFlux } from "../../../server/engine/balance/typed-surface.ts";
import { skyShareOfTypedLossFrac, uValueAtWindWM2K } from "../../../server/engine/balance/typed-u-value.ts";
import { outsideView } from "../../../server/engine/balance/view.ts";

const hour = { airTempC: -10, skyTempC: -30, windMS: 4, snow: false };

describe("a cover given as one U-value", () => {
  it("is used as typed on design nights", () => {
    const flux = typedFlux(6.4, 20, hour, 0.8, "asTyped");
    expect(flux.lossWM2).toBeCloseTo(6.4 * 30, 9);
    expect(flux.toSkyWM2).toBeGreaterThan(0);
    expect(flux.toSkyWM2).toBeLessThan(flux.lossWM2);
    expect(flux.faceTempsC[0]).toBeGreaterThanOrEqual(flux.faceTempsC[1] ?? 99);
    const wall = typedFlux(0.4, 20, hour, 0.5, "asTyped").faceTempsC;
    expect(wall[0]).toBeCloseTo(20 - 0.13 * 0.4 * 30, 6);
    expect(wall[1]).toBeLessThan(-9);
  });

  it("loses less in less wind and keeps its value at the table's wind", () => {
    expect(uValueAtWindWM2K(6.4, 6.7)).toBeCloseTo(6.4, 12);
    fc.assert(
      fc.property(
        fc.double({ min: 0.1, max: 12, noNaN: true }),
        fc.double({ min: 0, max: 19, noNaN: true }),
        (u, wind) => {
          expect(uValueAtWindWM2K(u, wind + 1)).toBeGreaterThan(uValueAtWindWM2K(u, wind));
        },
      ),
    );
  });

  it("refuses a U-value of nothing and a gale of 90 m/s", () => {
    expect(() => uValueAtWindWM2K(0, 4)).toThrowError(/uValueWM2K/);
    expect(() => uValueAtWindWM2K(4, 90)).toThrowError(/windMS/);
    expect(() => skyShareOfTypedLossFrac(4, 1.2)).toThrowError(/skyViewFrac/);
  });
});

describe("what a face sees", () => {
  it("sums to one, and the sky proper has less than the dome", () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 1, noNaN: true }), (dome) => {
        const view = outsideView(dome);
        expect(view.skyFrac + view.horizonFrac + view.groundFrac).toBeCloseTo(1, 12);
        expect(view.skyFrac).toBeLessThanOrEqual(dome);
      }),
    );
  });
});

describe("a ceiling under an attic", () => {
  const roof = {
    areaM2: 230,
    flux: (atticC: number, outside: typeof hour) => typedFlux(7, atticC, outside, 0.7, "asTyped"),
  };
  const attic = {
    ceilingAreaM2: 200,
    ceilingUValueWM2K: 0.25,
    volumeM3: 200,
    pressurePa: 101_325,
    parts: [roof],
  };

  it("closes: what comes through the ceiling leaves by roof and attic air", () => {
    const flux = ceilingFlux(attic, 20, hour, 0);
    const atticC = flux.faceTempsC[2] ?? 0;
    const roofW = 230 * 7 * (atticC + 10);
    const airW = airHeatWK(600, 101_325) * (atticC + 10);
    expect(flux.lossWM2 * 200).toBeCloseTo(roofW + airW, 2);
    expect(atticC).toBeGreaterThan(-10);
  });

  it("loses a little less than the bare U-value says", () => {
    const flux = ceilingFlux(attic, 20, hour, 0);
    expect(flux.lossWM2).toBeLessThan(0.25 * 30);
    expect(flux.lossWM2).toBeGreaterThan(0.9 * 0.25 * 30);
  });
});

describe("zero of a rising function", () => {
  it("is found from any guess, to the tolerance", () => {
    fc.assert(
      fc.property(
        fc.double({ min: -30, max: 30, noNaN: true }),
        fc.double({ min: -39, max: 39, noNaN: true }),
        fc.double({ min: 0, max: 0.02, noNaN: true }),
        (zero, guess, bend) => {
          const rising = (x: number) => (x - zero) * (1 + bend * (x - zero) ** 2);
          expect(findZero(rising, { low: -40, high: 40, guess, tolerance: 1e-9 })).toBeCloseTo(zero, 6);
        },
      ),
    );
  });

  it("gives the nearer end where there is none", () => {
    expect(findZero((x) => x - 50, { low: -40, high: 40 })).toBe(40);
    expect(findZero((x) => x + 50, { low: -40, high: 40 })).toBe(-40);
  });
});
