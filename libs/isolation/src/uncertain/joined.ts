import type { PartId, Section, SectionTree } from '@lampwright/harness';

/** A tree in which some points are no points any more, and where each old section went. */
export interface Joined {
  tree: SectionTree;
  /** By old section index. */
  home: number[];
}

/** Joins the sections that these points part; probabilities are added. O(sections). */
export function joined(tree: SectionTree, points: ReadonlySet<PartId>): Joined {
  const sections: Section[] = [];
  const home: number[] = [];
  for (const section of tree.sections) {
    const { parent, point, probability, weight } = section;
    const above = parent === null ? null : (home[parent] ?? 0);
    const into = above !== null && point && points.has(point.partId) ? sections[above] : undefined;
    if (into) {
      into.probability += probability;
      into.weight += weight;
      home.push(into.index);
      continue;
    }
    const index = sections.length;
    home.push(index);
    sections.push({ ...section, index, parent: above, children: [] });
    if (above !== null) sections[above]?.children.push(index);
  }
  return { tree: { ...tree, sections }, home };
}
