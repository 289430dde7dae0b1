import type { PartId } from './harness';
import { placeKey } from './placeKey';
import type { PlaceRef, SectionTree } from './sections';

/**
 * By section index: whether the section is still connected to the inlet while exactly these points are open. Ids that
 * are not points of this tree (those of other circuits) change nothing. O(sections + open).
 */
export function energisedSections(tree: SectionTree, open: Iterable<PartId>): boolean[] {
  const parted = new Set(open);
  const energised: boolean[] = [];
  for (const { parent, point } of tree.sections) {
    const fed = parent === null || energised[parent] === true;
    energised.push(fed && !(point && parted.has(point.partId)));
  }
  return energised;
}

/** The parts that are energised, wholly or on their feed side, while exactly these points are open. O(places). */
export function energisedParts(tree: SectionTree, open: Iterable<PartId>): Set<PartId> {
  const energised = energisedSections(tree, open);
  const parts = new Set<PartId>();
  for (const section of tree.sections) {
    if (!energised[section.index]) continue;
    for (const { ref } of section.places) if (ref.kind === 'part') parts.add(ref.id);
  }
  return parts;
}

/** The index of each place's section, by `placeKey`. O(places); build it once where many places are looked up. */
export function sectionByPlace(tree: SectionTree): Map<string, number> {
  const sections = new Map<string, number>();
  for (const section of tree.sections) {
    for (const place of section.places) sections.set(placeKey(place.ref), section.index);
  }
  return sections;
}

/**
 * The index of the section that holds a place. Half of a plug that this tree takes as one whole is found with the
 * whole; a whole plug that is split here lies in two sections and gives `undefined`, as does a place that the circuit
 * does not have. O(places).
 */
export function sectionOf(tree: SectionTree, ref: PlaceRef): number | undefined {
  const sections = sectionByPlace(tree);
  return sections.get(placeKey(ref)) ?? sections.get(placeKey({ kind: ref.kind, id: ref.id }));
}
