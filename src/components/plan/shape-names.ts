import type { ShapeType } from "../../../server/contracts/buildings.ts";

export const shapeNames: Record<ShapeType, string> = {
  roundArch: "Round arch",
  gothicArch: "Gothic arch",
  gable: "Gable",
  multiSpan: "Multi-span",
  venlo: "Venlo type",
  monoPitch: "Lean-to",
  atticBarn: "Gable, attic",
};
