export interface PlacedBoard<T> {
  item: T;
  xPx: number;
  yPx: number;
}

export interface BoardGroup<T> {
  items: T[];
  xPx: number;
  yPx: number;
}

/** Boards closer than this cover each other. */
export const FOLD_PX = 52;

/**
 * Folds boards that would cover each other into one, placed at their middle.
 * The order given is the order of importance, so that the same boards fold in the same way at every visit.
 */
export function foldBoards<T>(boards: PlacedBoard<T>[], withinPx = FOLD_PX): BoardGroup<T>[] {
  const groups: BoardGroup<T>[] = [];
  for (const board of boards) {
    const near = groups.find((group) => Math.hypot(group.xPx - board.xPx, group.yPx - board.yPx) < withinPx);
    if (near === undefined) {
      groups.push({ items: [board.item], xPx: board.xPx, yPx: board.yPx });
      continue;
    }
    const count = near.items.length;
    near.xPx = (near.xPx * count + board.xPx) / (count + 1);
    near.yPx = (near.yPx * count + board.yPx) / (count + 1);
    near.items.push(board.item);
  }
  return groups;
}
