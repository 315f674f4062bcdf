import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  type CoverBoundary,
  prepareCoverSolver,
  solveCoverBalance,
} from "../../../server/engine/envelope/cover-balance.ts";
import type { CoverLayer, CoverStack } from "../../../server/engine/envelope/cover-types.ts";
import { wetInside } from "../../../server/engine/envelope/wet-cover.ts";
import { EngineInputError } from "../../../server/engine/errors.ts";

/** Any film or sheet whose properties add up to at most one on each face. */
const layer: fc.Arbitrary<CoverLayer> = fc
  .record({
    through: fc.double({ min: 0, max: 0.8, noNaN: true }),
    a: fc.double({ min: 0.05, max: 0.95, noNaN: true }),
    b: fc.double({ min: 0.05, max: 0.95, noNaN: true }),
    thick: fc.boolean(),
    resistance: fc.double({ min: 0.001, max: 5, noNaN: true }),
  })
  .map(({ through, a, b, thick, resistance }) => {
    const tau = thick ? 0 : through;
    return {
      name: "layer",
      resistanceM2KW: thick ? resistance : 0,
      solarTransmittance: 0,
      solarReflectance: 0,
      emissivityIn: a * (1 - tau),
      emissivityOut: b * (1 - tau),
      longwaveTransmittance: tau,
    };
  });

const stack: fc.Arbitrary<CoverStack> = fc.array(layer, { minLength: 1, maxLength: 4 }).map((layers) => ({
  layers,
  gaps: layers
    .slice(1)
    .map(() => ({ kind: "still" as const, thicknessM: 0.05, coefficientWM2K: 0, airLeakageM3HM2: 0 })),
}));

const degrees = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const boundary: fc.Arbitrary<CoverBoundary> = fc.record({
  insideAirC: degrees(-5, 40),
  insideRadiantC: degrees(-5, 40),
  outsideAirC: degrees(-40, 35),
  skyC: degrees(-70, 30),
  groundC: degrees(-40, 35),
  skyViewFrac: fc.double({ min: 0, max: 1, noNaN: true }),
  tiltDeg: fc.double({ min: 0, max: 90, noNaN: true }),
  outsideCoefficientWM2K: fc.double({ min: 2, max: 60, noNaN: true }),
});

const fixed = (part: CoverBoundary): CoverBoundary => ({ ...part, insideCoefficientWM2K: 3 });
const fixedGaps = (cover: CoverStack): CoverStack => ({
  ...cover,
  gaps: cover.gaps.map((gap) => ({ ...gap, kind: "fixed" as const, coefficientWM2K: 2 })),
});

describe("cover balance", () => {
  it("closes: what leaves the room and the absorbed sun arrive outside", () => {
    fc.assert(
      fc.property(stack, boundary, fc.double({ min: 0, max: 300, noNaN: true }), (cover, part, sun) => {
        const absorbedSolarWM2 = cover.layers.map(() => sun / cover.layers.length);
        const balance = solveCoverBalance(cover, { ...part, absorbedSolarWM2 });
        const out = balance.toOutsideAirWM2 + balance.toSkyWM2 + balance.toGroundWM2;
        const into = balance.fromRoomWM2 + sun;
        expect(Math.abs(out - into)).toBeLessThan(1e-5 * Math.max(1, Math.abs(out)));
        expect(balance.residualWM2).toBeLessThan(1e-5);
        expect(balance.faceTempsC.every(Number.isFinite)).toBe(true);
      }),
    );
  });

  it("moves nothing where everything is equally warm", () => {
    fc.assert(
      fc.property(stack, degrees(-30, 40), (cover, temp) => {
        const balance = solveCoverBalance(cover, {
          insideAirC: temp,
          insideRadiantC: temp,
          outsideAirC: temp,
          skyC: temp,
          groundC: temp,
          skyViewFrac: 0.8,
          tiltDeg: 20,
          outsideCoefficientWM2K: 15,
        });
        expect(Math.abs(balance.fromRoomWM2)).toBeLessThan(1e-6);
        expect(Math.abs(balance.toSkyWM2)).toBeLessThan(1e-6);
        for (const face of balance.faceTempsC) expect(face).toBeCloseTo(temp, 6);
      }),
    );
  });

  it("never loses more under a warmer sky", () => {
    fc.assert(
      fc.property(stack, boundary, degrees(0.1, 30), (cover, part, warmer) => {
        const before = solveCoverBalance(fixedGaps(cover), fixed(part)).fromRoomWM2;
        const after = solveCoverBalance(
          fixedGaps(cover),
          fixed({ ...part, skyC: part.skyC + warmer }),
        ).fromRoomWM2;
        expect(after).toBeLessThanOrEqual(before + 1e-6);
      }),
    );
  });

  it("never loses more in wind while the outer face is warmer than the air, nor less while it is colder", () => {
    fc.assert(
      fc.property(stack, boundary, fc.double({ min: 0.5, max: 20, noNaN: true }), (cover, part, more) => {
        const calm = solveCoverBalance(fixedGaps(cover), fixed(part));
        const windy = solveCoverBalance(
          fixedGaps(cover),
          fixed({ ...part, outsideCoefficientWM2K: part.outsideCoefficientWM2K + more }),
        );
        const outer = calm.faceTempsC.at(-1)! - part.outsideAirC;
        const change = windy.fromRoomWM2 - calm.fromRoomWM2;
        if (outer > 0) expect(change).toBeGreaterThanOrEqual(-1e-6);
        else expect(change).toBeLessThanOrEqual(1e-6);
      }),
    );
  });

  it("never loses more with a thicker solid layer", () => {
    fc.assert(
      fc.property(
        boundary,
        fc.double({ min: 0.05, max: 4, noNaN: true }),
        fc.double({ min: 0.05, max: 4, noNaN: true }),
        (part, resistance, extra) => {
          const wall = (resistanceM2KW: number): CoverStack => ({
            layers: [
              {
                name: "wall",
                resistanceM2KW,
                solarTransmittance: 0,
                solarReflectance: 0,
                emissivityIn: 0.9,
                emissivityOut: 0.9,
                longwaveTransmittance: 0,
              },
            ],
            gaps: [],
          });
          const thin = solveCoverBalance(wall(resistance), fixed(part)).fromRoomWM2;
          const thick = solveCoverBalance(wall(resistance + extra), fixed(part)).fromRoomWM2;
          expect(Math.abs(thick)).toBeLessThanOrEqual(Math.abs(thin) + 1e-6);
        },
      ),
    );
  });

  it("finds the same answer from another start", () => {
    fc.assert(
      fc.property(stack, boundary, (cover, part) => {
        const solver = prepareCoverSolver(cover);
        const cold = solver.solve(part);
        const warm = solver.solve(
          part,
          cold.faceTempsC.map((temp) => temp + 3),
        );
        cold.faceTempsC.forEach((temp, index) => {
          expect(warm.faceTempsC[index]!).toBeCloseTo(temp, 3);
        });
      }),
      { numRuns: 50 },
    );
  });

  it("holds back radiation once a film is wet", () => {
    const dry: CoverStack = {
      layers: [
        {
          name: "film",
          resistanceM2KW: 0,
          solarTransmittance: 0.8,
          solarReflectance: 0.1,
          emissivityIn: 0.2,
          emissivityOut: 0.2,
          longwaveTransmittance: 0.7,
        },
      ],
      gaps: [],
    };
    const night: CoverBoundary = {
      insideAirC: 16,
      insideRadiantC: 16,
      outsideAirC: 0,
      skyC: -20,
      groundC: 0,
      skyViewFrac: 0.9,
      tiltDeg: 20,
      outsideCoefficientWM2K: 12,
    };
    expect(solveCoverBalance(wetInside(dry), night).fromRoomWM2).toBeLessThan(
      solveCoverBalance(dry, night).fromRoomWM2,
    );
  });

  it("names a layer that cannot be", () => {
    const broken: CoverStack = {
      layers: [
        {
          name: "film",
          resistanceM2KW: 0,
          solarTransmittance: 0,
          solarReflectance: 0,
          emissivityIn: 0.6,
          emissivityOut: 0.6,
          longwaveTransmittance: 0.7,
        },
      ],
      gaps: [],
    };
    expect(() => prepareCoverSolver(broken)).toThrow(EngineInputError);
    expect(() => prepareCoverSolver(broken)).toThrow(
      /longwaveTransmittance\[0\] is 0.7; it must lie between 0 and 0.4/,
    );
  });
});
