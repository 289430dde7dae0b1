import type { Cells } from './cells';

/**
 * Some of the cells as a question of their own, with nothing open: a first cell that holds nothing, and on it the trees
 * that hang apart. `place` says where each cell has gone. O(some).
 */
export function subCells(
  cells: Cells,
  some: readonly number[],
): { cells: Cells; place: ReadonlyMap<number, number> } {
  const place = new Map(some.map((v, at) => [v, at + 1]));
  const from = [-1, ...some];
  const pick = (values: Float64Array) => Float64Array.from(from, (v) => values[v] ?? 0);
  const few = {
    ...cells,
    size: from.length,
    parent: Int32Array.from(from, (v, at) =>
      at === 0 ? -1 : (place.get(cells.parent[v] ?? -1) ?? 0),
    ),
    weight: pick(cells.weight),
    hands: pick(cells.hands),
    walk: pick(cells.walk),
    points: from.map((v) => cells.points[v] ?? null),
    section: Int32Array.from(from, (v) => cells.section[v] ?? -1),
    open: [],
    blocking: [],
    spent: [],
    blockingWalk: 0,
    spentWalk: 0,
  };
  return { cells: few, place };
}
