import type { Harness, PlaceRef, SectionTree } from '@lampwright/harness';

/** Whether two references overlap: the same place, or half of a plug and the whole of it. */
export function samePlace(a: PlaceRef, b: PlaceRef): boolean {
  if (a.kind !== b.kind || a.id !== b.id) return false;
  if (a.kind === 'run' || b.kind === 'run') return true;
  return !a.half || !b.half || a.half === b.half;
}

/** Whether the plan has such a place. */
export function isPlace(harness: Harness, ref: PlaceRef): boolean {
  if (ref.kind === 'run') return harness.runs.some((run) => run.id === ref.id);
  const part = harness.parts.find(({ id }) => id === ref.id);
  return part !== undefined && (!ref.half || part.kind === 'plug');
}

/** The sections that a place lies in: two for the whole of a plug that the tree takes as halves. O(places). */
export function sectionsOf(tree: SectionTree, ref: PlaceRef): number[] {
  return tree.sections
    .filter((section) => section.places.some((place) => samePlace(place.ref, ref)))
    .map((section) => section.index);
}
