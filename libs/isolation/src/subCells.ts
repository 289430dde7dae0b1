import type { Cells } from './cells';
import type { Situation } from './situation';

/**
 * The cells of a situation as a question of their own. Trees that hang apart join in a new first cell that holds nothing.
 * O(cells of the situation).
 */
export function subCells(cells: Cells, situation: Situation): Cells {
  const place = new Map<number, number>();
  const roots = situation.cells.filter((v) => !situation.cells.includes(cells.parent[v] ?? -1));
  const joined = roots.length > 1 || situation.open.includes(roots[0] ?? -1);
  const from = joined ? [-1, ...situation.cells] : [...situation.cells];
  from.forEach((v, at) => place.set(v, at));
  const pick = (values: Float64Array) => Float64Array.from(from, (v) => values[v] ?? 0);
  return {
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
    open: situation.open.map((v) => place.get(v) ?? 0),
    blockingWalk: situation.forced,
    spentWalk: situation.spent,
  };
}
