import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { EngineInputError } from "../../../server/engine/errors.ts";
import { footprintCorners } from "../../../server/engine/geometry/footprint.ts";
import { houseGeometry } from "../../../server/engine/geometry/house-geometry.ts";
import type { HouseShape } from "../../../server/engine/geometry/house-shape.ts";
import { sectionOutline } from "../../../server/engine/geometry/section.ts";

const m = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const shapes: fc.Arbitrary<HouseShape> = fc.oneof(
  fc.record({
    type: fc.constant("roundArch" as const),
    lengthM: m(3, 200),
    widthM: m(4, 12),
    riseM: m(1, 4),
    wallHeightM: m(0, 2),
  }),
  fc.record({
    type: fc.constant("gothicArch" as const),
    lengthM: m(3, 200),
    widthM: m(4, 12),
    eaveHeightM: m(1, 2.5),
    ridgeHeightM: m(3.5, 6),
    roofBowM: m(0, 0.6),
  }),
  fc.record({
    type: fc.constant("gable" as const),
    lengthM: m(3, 200),
    widthM: m(4, 30),
    eaveHeightM: m(1, 3),
    ridgeHeightM: m(3.5, 9),
  }),
  fc.record({
    type: fc.constant("multiSpan" as const),
    lengthM: m(3, 200),
    spanWidthM: m(4, 12),
    spanCount: fc.integer({ min: 1, max: 60 }),
    gutterHeightM: m(2, 5),
    ridgeHeightM: m(5.5, 8),
  }),
  fc.record({
    type: fc.constant("venlo" as const),
    lengthM: m(3, 300),
    spanWidthM: m(3, 5),
    spanCount: fc.integer({ min: 1, max: 60 }),
    gutterHeightM: m(3, 7),
    roofSlopeDeg: m(15, 30),
  }),
  fc.record({
    type: fc.constant("monoPitch" as const),
    lengthM: m(3, 60),
    widthM: m(3, 12),
    lowEaveM: m(1.5, 2.5),
    highEaveM: m(2.6, 5),
  }),
  fc.record({
    type: fc.constant("atticBarn" as const),
    lengthM: m(3, 200),
    widthM: m(4, 30),
    eaveHeightM: m(2, 3),
    ridgeHeightM: m(3.5, 9),
  }),
);

/** The same house drawn at another scale: every length grows, counts and slopes stay. */
function scaled(shape: HouseShape, by: number): HouseShape {
  return Object.fromEntries(
    Object.entries(shape).map(([name, value]) => [
      name,
      typeof value === "number" && name.endsWith("M") ? value * by : value,
    ]),
  ) as unknown as HouseShape;
}

describe("house geometry", () => {
  it("grows with the square and the cube of its lengths", () => {
    fc.assert(
      fc.property(shapes, m(0.5, 2), (shape, by) => {
        const one = houseGeometry(shape, { ridgeBearingDeg: 30 });
        const other = houseGeometry(scaled(shape, by), { ridgeBearingDeg: 30 });
        expect(other.coverAreaM2 / one.coverAreaM2).toBeCloseTo(by ** 2, 6);
        expect(other.volumeM3 / one.volumeM3).toBeCloseTo(by ** 3, 6);
        expect(other.floorAreaM2 / one.floorAreaM2).toBeCloseTo(by ** 2, 6);
      }),
    );
  });

  it("covers at least its floor, and the upward parts of its shell lie exactly over it", () => {
    fc.assert(
      fc.property(shapes, (shape) => {
        const { surfaces, floorAreaM2 } = houseGeometry(shape, { ridgeBearingDeg: 0 });
        const roofs = surfaces.filter((surface) => surface.role === "roof");
        const shadow = roofs.reduce(
          (sum, { areaM2, tiltDeg }) => sum + areaM2 * Math.cos((tiltDeg * Math.PI) / 180),
          0,
        );
        const curved = shape.type === "roundArch" || shape.type === "gothicArch";
        // Facets stand for a curve, so their shadows differ a little from the floor.
        expect(Math.abs(shadow / floorAreaM2 - 1)).toBeLessThan(curved ? 0.09 : 1e-9);
      }),
    );
  });

  it("loses wall to a kneewall and nothing else", () => {
    fc.assert(
      fc.property(shapes, (shape) => {
        const plain = houseGeometry(shape, { ridgeBearingDeg: 0 });
        const kneewallHeightM = Math.min(0.6, plain.eaveHeightM);
        const with_ = houseGeometry(shape, { ridgeBearingDeg: 0, kneewallHeightM });
        expect(with_.coverAreaM2).toBeCloseTo(plain.coverAreaM2, 6);
        expect(with_.volumeM3).toBe(plain.volumeM3);
      }),
    );
  });

  it("has finite, positive surfaces that look in true directions", () => {
    fc.assert(
      fc.property(shapes, m(0, 180), (shape, ridgeBearingDeg) => {
        for (const surface of houseGeometry(shape, { ridgeBearingDeg }).surfaces) {
          expect(surface.areaM2).toBeGreaterThan(0);
          expect(surface.azimuthDeg).toBeGreaterThanOrEqual(0);
          expect(surface.azimuthDeg).toBeLessThan(360);
          expect(surface.skyViewFrac).toBeGreaterThanOrEqual(0);
          expect(surface.skyViewFrac).toBeLessThanOrEqual(1);
        }
      }),
    );
  });

  it("draws a line from foot to foot", () => {
    fc.assert(
      fc.property(shapes, (shape) => {
        const line = sectionOutline(shape, 3);
        expect(line[0]).toEqual({ x: 0, y: 0 });
        expect(line.at(-1)!.y).toBe(0);
        expect(line.every((point) => Number.isFinite(point.x) && point.y >= -1e-9)).toBe(true);
      }),
    );
  });

  it("names the measure that cannot be", () => {
    const low = { type: "gable", lengthM: 10, widthM: 6, eaveHeightM: 3, ridgeHeightM: 2 } as const;
    expect(() => houseGeometry(low, { ridgeBearingDeg: 0 })).toThrow(EngineInputError);
    expect(() => houseGeometry(low, { ridgeBearingDeg: 0 })).toThrow(
      /ridgeHeightM is 2 m; it must lie between 3.01 m/,
    );
  });

  it("puts a ground plan on the globe with its true sides", () => {
    fc.assert(
      fc.property(
        m(-70, 70),
        m(-180, 180),
        m(5, 300),
        m(4, 60),
        m(0, 180),
        (latitudeDeg, longitudeDeg, lengthM, widthM, bearing) => {
          const corners = footprintCorners({ latitudeDeg, longitudeDeg }, lengthM, widthM, bearing);
          const distance = (a: number, b: number) => {
            const [from, to] = [corners[a]!, corners[b]!];
            const north = (to.latitudeDeg - from.latitudeDeg) * 111_195.08;
            const east =
              (to.longitudeDeg - from.longitudeDeg) * 111_195.08 * Math.cos((latitudeDeg * Math.PI) / 180);
            return Math.hypot(north, east);
          };
          expect(distance(0, 1) / widthM).toBeCloseTo(1, 3);
          expect(distance(1, 2) / lengthM).toBeCloseTo(1, 3);
        },
      ),
    );
  });
});
