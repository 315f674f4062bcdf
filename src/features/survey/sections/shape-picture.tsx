import { useMemo } from "react";
import type { ShapeType } from "../../../../server/contracts/buildings.ts";
import type { Quantity } from "../../../../server/contracts/quantity.ts";
import type { SurveyShape } from "../../../../server/contracts/survey.ts";
import { BuildingOutline } from "../../../components/building-outline.tsx";
import { sectionShape } from "../../../components/section-drawing/section-shape.ts";
import { changeShape } from "../change-shape.ts";

const metres = (value: number): Quantity => ({ typed: String(value), unit: "m", origin: "default" });

const examples: Partial<Record<ShapeType, SurveyShape>> = {
  roundArch: {
    type: "roundArch",
    length: metres(30),
    width: metres(8),
    rise: metres(3.6),
    wallHeight: metres(0),
  },
  gothicArch: {
    type: "gothicArch",
    length: metres(30),
    width: metres(9),
    eaveHeight: metres(1.8),
    ridgeHeight: metres(4.8),
    roofBow: metres(0.5),
  },
  multiSpan: {
    type: "multiSpan",
    length: metres(30),
    spanWidth: metres(4.6),
    spanCount: metres(3),
    gutterHeight: metres(3),
    ridgeHeight: metres(4.6),
  },
  venlo: {
    type: "venlo",
    length: metres(30),
    spanWidth: metres(3),
    spanCount: metres(6),
    gutterHeight: metres(4),
    roofSlope: { typed: "24", unit: "deg", origin: "default" },
  },
};

const plain: SurveyShape = {
  type: "gable",
  length: metres(30),
  width: metres(9),
  eaveHeight: metres(3),
  ridgeHeight: metres(5),
};

/** A typical house of a shape, for the choice of shapes. */
export function ShapePicture({ type }: { type: ShapeType }) {
  const outline = useMemo(
    () => sectionShape(examples[type] ?? changeShape(plain, type))?.outline ?? [],
    [type],
  );
  return <BuildingOutline shapeType={type} outline={outline} size={{ width: 60, height: 34 }} />;
}
