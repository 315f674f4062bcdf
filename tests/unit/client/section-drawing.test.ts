import fc from "fast-check";
import { describe, expect, test } from "vitest";
import type { Quantity } from "../../../server/contracts/quantity.ts";
import type { SurveyShape } from "../../../server/contracts/survey.ts";
import { cutAfterSpans, outlineBox } from "../../../src/components/outline-points.ts";
import { placeArrows } from "../../../src/components/section-drawing/arrow-places.ts";
import { frameFor, innerLine } from "../../../src/components/section-drawing/frame.ts";
import { heatLayouts, spread } from "../../../src/components/section-drawing/heat-layout.ts";
import { sectionShape } from "../../../src/components/section-drawing/section-shape.ts";
import { derivedSizes } from "../../../src/features/survey/derive-sizes.ts";
import { surveyFixture } from "../../components/support/plan-fixture.ts";

const m = (value: number): Quantity => ({ typed: String(value), unit: "m", origin: "measured" });

const shapes: Record<SurveyShape["type"], SurveyShape> = {
  roundArch: { type: "roundArch", length: m(30), width: m(8), rise: m(3.5), wallHeight: m(0) },
  gothicArch: {
    type: "gothicArch",
    length: m(36),
    width: m(9.6),
    eaveHeight: m(1.7),
    ridgeHeight: m(4.7),
    roofBow: m(0.46),
  },
  gable: { type: "gable", length: m(50), width: m(13), eaveHeight: m(2.7), ridgeHeight: m(5.9) },
  multiSpan: {
    type: "multiSpan",
    length: m(48),
    spanWidth: m(9.6),
    spanCount: { typed: "3", unit: "each", origin: "measured" },
    gutterHeight: m(4),
    ridgeHeight: m(6),
  },
  venlo: {
    type: "venlo",
    length: m(100),
    spanWidth: m(4),
    spanCount: { typed: "60", unit: "each", origin: "measured" },
    gutterHeight: m(6),
    roofSlope: { typed: "22.5", unit: "deg", origin: "measured" },
  },
  monoPitch: { type: "monoPitch", length: m(6), width: m(4), lowEave: m(2), highEave: m(3.4) },
  atticBarn: { type: "atticBarn", length: m(52), width: m(13), eaveHeight: m(2.7), ridgeHeight: m(5.9) },
};

describe("the section of a house", () => {
  test.each(Object.values(shapes))(
    "$type stands on the ground, is as wide and as high as surveyed",
    (shape) => {
      const section = sectionShape(shape);
      expect(section).not.toBeNull();
      if (!section) return;
      const box = outlineBox(section.outline);
      expect(section.outline[0]?.y).toBeCloseTo(0, 9);
      expect(section.outline.at(-1)?.y).toBeCloseTo(0, 9);
      expect(box.widthM).toBeCloseTo(section.drawnWidthM, 6);
      expect(box.heightM).toBeCloseTo(section.topM, 6);
    },
  );

  test.each(Object.values(shapes))("$type has the heights the engine's own geometry finds", (shape) => {
    const { sizes } = derivedSizes({ ...surveyFixture(), shape }, "si");
    const section = sectionShape(shape);
    expect(section?.topM).toBeCloseTo(sizes?.ridgeHeightM ?? Number.NaN, 6);
    expect(section?.widthM).toBeCloseTo(sizes?.widthM ?? Number.NaN, 6);
  });

  test("sixty spans are drawn as three", () => {
    const section = sectionShape(shapes.venlo);
    expect(section?.spans).toBe(60);
    expect(section?.drawnSpans).toBe(3);
    expect(section?.widthM).toBe(240);
  });

  test("sizes that make no house give no picture", () => {
    expect(sectionShape({ ...shapes.gable, ridgeHeight: m(2) } as SurveyShape)).toBeNull();
    expect(sectionShape({ ...shapes.gable, width: { ...m(1), typed: "" } } as SurveyShape)).toBeNull();
  });

  test("the inner skin of a straight wall runs parallel to the outer one", () => {
    const outline = sectionShape(shapes.monoPitch)?.outline ?? [];
    const inner = innerLine(outline, 0.2);
    expect(inner[0]?.x).toBeCloseTo(-1.8, 9);
    expect(inner[1]?.x).toBeCloseTo(-1.8, 9);
  });
});

describe("arrows", () => {
  const section = sectionShape(shapes.gothicArch);
  if (!section) throw new Error("The example house must be drawable.");
  const layout = heatLayouts.wide;
  const flows = {
    cover: 36_000,
    sky: 14_000,
    air: 9_000,
    ground: 2_000,
    sun: 0,
    stock: 0,
    lights: 40,
    heater: 61_000,
  };

  test("are as wide as the heat they carry", () => {
    const perW = layout.widestArrow / 61_000;
    const plan = placeArrows(section, frameFor(section, layout), flows, perW, layout);
    for (const arrow of plan.arrows) {
      expect(arrow.width).toBeCloseTo(Math.max(2.2, flows[arrow.path] * perW), 9);
    }
  });

  test("of paths under 0.05 kW are not drawn", () => {
    const plan = placeArrows(section, frameFor(section, layout), flows, 0.001, layout);
    expect(plan.arrows.map((arrow) => arrow.path)).not.toContain("lights");
    expect(plan.arrows.map((arrow) => arrow.path)).not.toContain("sun");
  });

  test.each(["wide", "phone"] as const)("stay inside the %s drawing for every shape", (size) => {
    const fit = heatLayouts[size];
    const all = {
      cover: 40_000,
      sky: 40_000,
      air: 40_000,
      ground: 20_000,
      sun: 0,
      stock: 30_000,
      lights: 9_000,
      heater: 40_000,
    };
    for (const shape of Object.values(shapes)) {
      const drawn = sectionShape(shape);
      if (!drawn) throw new Error(shape.type);
      const plan = placeArrows(drawn, frameFor(drawn, fit), all, fit.widestArrow / 40_000, fit);
      for (const arrow of plan.arrows) {
        expect(arrow.tip.x, `${shape.type} ${arrow.path}`).toBeLessThanOrEqual(fit.width);
        expect(arrow.tip.y, `${shape.type} ${arrow.path}`).toBeGreaterThanOrEqual(0);
      }
    }
  });
});

describe("labels moved apart", () => {
  test("keep their distance and their order, and stay inside", () => {
    fc.assert(
      fc.property(
        fc.array(fc.double({ min: 0, max: 400, noNaN: true }), { minLength: 1, maxLength: 5 }),
        (wanted) => {
          const placed = spread(wanted, 46, 0, 400);
          const sorted = [...placed].sort((a, b) => a - b);
          sorted.slice(1).forEach((y, i) => {
            expect(y - (sorted[i] ?? 0)).toBeGreaterThanOrEqual(46 - 1e-9);
          });
          expect(Math.min(...placed)).toBeGreaterThanOrEqual(-1e-9);
          expect(Math.max(...placed)).toBeLessThanOrEqual(400 + 1e-9);
        },
      ),
    );
  });
});

describe("an outline at list size", () => {
  test("keeps three spans of many and says that it was cut", () => {
    const outline = [
      { x: 0, y: 0 },
      { x: 0, y: 4 },
      ...Array.from({ length: 10 }, (_, i) => [
        { x: i * 4 + 2, y: 5 },
        { x: i * 4 + 4, y: 4 },
      ]).flat(),
      { x: 40, y: 0 },
    ];
    const cut = cutAfterSpans(outline, 3);
    expect(cut.cut).toBe(true);
    expect(cut.spans).toBe(10);
    expect(cut.points.at(-1)).toEqual({ x: 12, y: 4 });
  });

  test("leaves a single roof whole", () => {
    const outline = sectionShape(shapes.gable)?.outline ?? [];
    expect(cutAfterSpans(outline, 3)).toMatchObject({ cut: false, points: outline });
  });
});
