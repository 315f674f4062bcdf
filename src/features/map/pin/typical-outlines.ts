import type { BuildingKind, ShapeType } from "../../../../server/contracts/buildings.ts";
import type { OutlinePoint } from "../../../components/outline-points.ts";

function curve(count: number, at: (share: number) => OutlinePoint): OutlinePoint[] {
  return Array.from({ length: count + 1 }, (_, index) => at(index / count));
}

const points = (...pairs: [number, number][]): OutlinePoint[] => pairs.map(([x, y]) => ({ x, y }));

const gable = points([0, 0], [0, 2.6], [5, 5], [10, 2.6], [10, 0]);

/** A house of each shape, small, for the choice of shapes. */
export const typicalOutlines: Record<ShapeType, OutlinePoint[]> = {
  roundArch: curve(24, (share) => ({
    x: 4.5 - 4.5 * Math.cos(Math.PI * share),
    y: 4 * Math.sin(Math.PI * share),
  })),
  gothicArch: [
    { x: 0, y: 0 },
    ...curve(10, (share) => ({ x: 4.5 * share, y: 1.8 + 3 * (1.5 * share - 0.5 * share * share) })),
    ...curve(10, (share) => ({
      x: 4.5 + 4.5 * share,
      y: 1.8 + 3 * (1.5 * (1 - share) - 0.5 * (1 - share) ** 2),
    })).slice(1),
    { x: 9, y: 0 },
  ],
  gable,
  multiSpan: points(
    [0, 0],
    [0, 3],
    [2.4, 4.6],
    [4.8, 3],
    [7.2, 4.6],
    [9.6, 3],
    [12, 4.6],
    [14.4, 3],
    [14.4, 0],
  ),
  venlo: points([0, 0], [0, 4], [1.6, 4.8], [3.2, 4], [4.8, 4.8], [6.4, 4], [8, 4.8], [9.6, 4], [9.6, 0]),
  monoPitch: points([0, 0], [0, 2.4], [7, 4], [7, 0]),
  atticBarn: gable,
};

/** Shapes each kind comes in, most usual first. */
export const shapesOf: Record<BuildingKind, ShapeType[]> = {
  greenhouse: ["roundArch", "gothicArch", "gable", "multiSpan", "venlo", "monoPitch"],
  barn: ["atticBarn", "gable", "monoPitch", "roundArch", "gothicArch", "multiSpan"],
};
