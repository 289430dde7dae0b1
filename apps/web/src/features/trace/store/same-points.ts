import type { PartId } from '@lampwright/harness';

/** Whether two lists name the same points, in any order. */
export function samePoints(a: readonly PartId[], b: readonly PartId[]): boolean {
  return a.length === b.length && a.every((point) => b.includes(point));
}
