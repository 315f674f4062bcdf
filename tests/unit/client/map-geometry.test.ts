import fc from "fast-check";
import type { FeatureCollection } from "geojson";
import { describe, expect, test } from "vitest";
import { drawnOnBothSides } from "../../../src/components/sheet-map/date-line.ts";
import { FOLD_PX, foldBoards } from "../../../src/components/sheet-map/fold-boards.ts";
import {
  degreeLabel,
  graticuleLinesDeg,
  graticuleStepDeg,
} from "../../../src/components/sheet-map/graticule.ts";
import { scaleBar } from "../../../src/components/sheet-map/scale-bar.ts";
import { houseFromClicks } from "../../../src/features/map/geometry/three-clicks.ts";
import {
  afterRidgeDrag,
  afterSideDrag,
  corners,
  eastNorthM,
  fromMiddle,
  ridgeBearing,
  wrapLongitude,
} from "../../../src/lib/footprint.ts";

const place = fc.record({
  latitudeDeg: fc.double({ min: -70, max: 70, noNaN: true }),
  longitudeDeg: fc.double({ min: -179, max: 179, noNaN: true }),
});
const plan = fc.record({
  lengthM: fc.double({ min: 4, max: 400, noNaN: true }),
  widthM: fc.double({ min: 3, max: 200, noNaN: true }),
  bearingDeg: fc.integer({ min: 0, max: 179 }),
});

describe("the ground plan on the map", () => {
  test("has sides of the given length and width, wherever it lies and however it is turned", () => {
    fc.assert(
      fc.property(place, plan, (middle, footprint) => {
        const [a, b, c] = corners(middle, footprint).map((corner) => eastNorthM(middle, corner));
        const side = (from = { eastM: 0, northM: 0 }, to = { eastM: 0, northM: 0 }) =>
          Math.hypot(to.eastM - from.eastM, to.northM - from.northM);
        expect(side(a, b)).toBeCloseTo(footprint.lengthM, 1);
        expect(side(b, c)).toBeCloseTo(footprint.widthM, 1);
      }),
    );
  });

  test("a ridge that runs north to south lies along the meridian", () => {
    const end = fromMiddle({ latitudeDeg: 52, longitudeDeg: 4 }, 0, 50, 0);
    expect(end.longitudeDeg).toBeCloseTo(4, 9);
    expect(end.latitudeDeg).toBeGreaterThan(52);
  });

  test("dragging the ridge's end to where it is changes nothing", () => {
    fc.assert(
      fc.property(place, plan, (middle, { lengthM, bearingDeg }) => {
        const dragged = afterRidgeDrag(middle, fromMiddle(middle, bearingDeg, lengthM / 2, 0));
        expect(dragged.lengthM).toBeCloseTo(lengthM, 1);
        expect(dragged.bearingDeg % 180).toBe(bearingDeg % 180);
      }),
    );
  });

  test("dragging a side along the wall does not change the width", () => {
    const middle = { latitudeDeg: -43, longitudeDeg: 172 };
    expect(afterSideDrag(middle, 30, fromMiddle(middle, 30, 12, 4.5))).toBeCloseTo(9, 3);
  });

  test("bearings half a turn apart are one ridge", () => {
    expect(ridgeBearing(190)).toBe(10);
    expect(ridgeBearing(-10)).toBe(170);
    expect(ridgeBearing(180)).toBe(0);
  });

  test("three clicks draw the house they were clicked round", () => {
    const middle = { latitudeDeg: 44.5, longitudeDeg: -73 };
    const house = houseFromClicks([
      fromMiddle(middle, 40, -15, 0),
      fromMiddle(middle, 40, 15, 0),
      fromMiddle(middle, 40, 3, -4.5),
    ]);
    expect(house.footprint.lengthM).toBeCloseTo(30, 1);
    expect(house.footprint.widthM).toBeCloseTo(9, 1);
    expect(house.footprint.bearingDeg).toBe(40);
    expect(house.middle.latitudeDeg).toBeCloseTo(middle.latitudeDeg, 6);
  });

  test("a longitude comes back into its half of the world", () => {
    expect(wrapLongitude(190)).toBe(-170);
    expect(wrapLongitude(-181)).toBe(179);
    expect(wrapLongitude(4.25)).toBe(4.25);
  });
});

describe("the grid of the sheet", () => {
  test("keeps its lines apart at every closeness", () => {
    fc.assert(
      fc.property(fc.double({ min: 1.5, max: 3e6, noNaN: true }), (pxPerDeg) => {
        expect(graticuleStepDeg(pxPerDeg, 120) * pxPerDeg).toBeGreaterThanOrEqual(
          Math.min(120, 90 * pxPerDeg),
        );
      }),
    );
  });

  test("draws every multiple of the step in view, the ends with it", () => {
    expect(graticuleLinesDeg(-0.31, 0.2, 0.1)).toEqual([-0.3, -0.2, -0.1, 0, 0.1, 0.2]);
    expect(graticuleLinesDeg(3.1, 3.4, 0.5)).toEqual([]);
  });

  test("labels say the half of the world and tell neighbours apart", () => {
    expect(degreeLabel(-33.5, "latitude", 0.5)).toBe("33.5° S");
    expect(degreeLabel(4.25, "longitude", 0.05)).toBe("4.25° E");
    expect(degreeLabel(0, "longitude", 10)).toBe("0°");
  });

  test("the scale bar fits, has a round length and says it in the reader's units", () => {
    expect(scaleBar(50, 190, "si")).toEqual({ widthPx: 100, ticks: [0, 2.5, 5], unit: "km" });
    expect(scaleBar(0.5, 190, "si")).toMatchObject({ ticks: [0, 25, 50], unit: "m" });
    const us = scaleBar(50, 190, "us");
    expect(us.unit).toBe("mi");
    expect(us.ticks[2]).toBe(5);
    expect(us.widthPx).toBeCloseTo((5 * 1609.344) / 50, 6);
  });
});

describe("boards that would cover each other", () => {
  const board = (item: string, xPx: number, yPx = 0) => ({ item, xPx, yPx });

  test("fold into one at their middle", () => {
    const groups = foldBoards([board("a", 0), board("b", 20), board("c", 300)]);
    expect(groups.map((group) => group.items)).toEqual([["a", "b"], ["c"]]);
    expect(groups[0]?.xPx).toBe(10);
  });

  test("never lose a building, and never leave two boards where one covers the other's first", () => {
    const boards = fc.array(fc.tuple(fc.integer({ min: 0, max: 800 }), fc.integer({ min: 0, max: 800 })), {
      maxLength: 40,
    });
    fc.assert(
      fc.property(boards, (points) => {
        const groups = foldBoards(points.map(([x, y], index) => board(String(index), x, y)));
        expect(groups.flatMap((group) => group.items).sort()).toEqual(
          points.map((_, index) => String(index)).sort(),
        );
      }),
    );
    expect(foldBoards([board("a", 0), board("b", FOLD_PX)])).toHaveLength(2);
  });
});

describe("land on both sides of the date line", () => {
  const land = (ring: number[][]): FeatureCollection => ({
    type: "FeatureCollection",
    features: [{ type: "Feature", properties: {}, geometry: { type: "Polygon", coordinates: [ring] } }],
  });
  const ringsOf = (collection: FeatureCollection) => {
    const geometry = collection.features[0]?.geometry;
    return geometry?.type === "MultiPolygon" ? geometry.coordinates.map((polygon) => polygon[0] ?? []) : [];
  };

  test("is drawn once on each side, and no edge runs round the world", () => {
    const rings = ringsOf(
      drawnOnBothSides(
        land([
          [170, 60],
          [180, 65],
          [-175, 65],
          [-178, 60],
          [170, 60],
        ]),
      ),
    );
    expect(rings).toHaveLength(2);
    for (const ring of rings) {
      for (let i = 1; i < ring.length; i++) {
        expect(Math.abs((ring[i]?.[0] ?? 0) - (ring[i - 1]?.[0] ?? 0))).toBeLessThan(180);
      }
    }
  });

  test("other land stays as it is", () => {
    const ring = [
      [0, 0],
      [10, 0],
      [10, 10],
      [0, 0],
    ];
    expect(ringsOf(drawnOnBothSides(land(ring)))).toEqual([ring]);
  });
});
