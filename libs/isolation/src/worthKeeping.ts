import type { PartId } from '@lampwright/harness';
import { walkSeconds } from './costs';
import type { Question } from './types';

/**
 * Of useful points in a row with nothing in question between them, which all part the same sections: those that no
 * other beats in both handling and walking, and those that are open. Given and returned by section. O(n log n).
 */
export function worthKeeping(
  { tree, timing }: Question,
  useful: ReadonlySet<number>,
  beyond: readonly number[],
  open: ReadonlySet<PartId>,
): Set<number> {
  const kept = new Set<number>();
  for (const row of rowsOf({ tree, useful, beyond })) {
    const points = row.flatMap((index) => {
      const point = tree.sections[index]?.point;
      if (!point) return [];
      const hands = point.openSeconds + point.closeSeconds;
      return [{ index, hands, walk: walkSeconds(point, timing), isOpen: open.has(point.partId) }];
    });
    points.sort((a, b) => a.hands - b.hands || a.walk - b.walk || a.index - b.index);
    let nearest = Infinity;
    for (const { index, walk, isOpen } of points) {
      if (isOpen || walk < nearest) kept.add(index);
      nearest = Math.min(nearest, walk);
    }
  }
  return kept;
}

interface Rows {
  tree: Question['tree'];
  useful: ReadonlySet<number>;
  beyond: readonly number[];
}

function rowsOf({ tree, useful, beyond }: Rows): Iterable<number[]> {
  const rows = new Map<number, number[]>();
  /** By section: the nearest useful point on the way from the inlet, and the head of the row it is in. */
  const upstream: number[] = [];
  const headOf: number[] = [];
  for (const { index, parent } of tree.sections) {
    const above = parent === null ? -1 : (upstream[parent] ?? -1);
    upstream[index] = above;
    if (!useful.has(index)) continue;
    upstream[index] = index;
    const head = above >= 0 && beyond[above] === beyond[index] ? (headOf[above] ?? index) : index;
    headOf[index] = head;
    const row = rows.get(head);
    if (row) row.push(index);
    else rows.set(head, [index]);
  }
  return rows.values();
}
