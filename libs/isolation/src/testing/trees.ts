import type { PartId, SectionTree, SeparablePoint } from '@lampwright/harness';

export interface CellSpec {
  /** Relative; 1 where left out. */
  weight?: number;
  openSeconds?: number;
  closeSeconds?: number;
  along?: number;
}

/**
 * A section tree straight from its parent list (-1 first, parents before children), with points `p1`, `p2`, ... for the
 * sections 1, 2, ...
 */
export function treeOf(
  parents: readonly number[],
  spec: (section: number) => CellSpec = () => ({}),
): SectionTree {
  const specs = parents.map((_, index) => spec(index));
  const total = specs.reduce((sum, { weight = 1 }) => sum + weight, 0);
  return {
    circuit: 'c',
    sections: parents.map((parent, index) => {
      const { weight = 1, openSeconds = 1, closeSeconds = 1, along = 0 } = specs[index] ?? {};
      return {
        index,
        parent: parent < 0 ? null : parent,
        point: parent < 0 ? null : { partId: pointId(index), openSeconds, closeSeconds, along },
        children: parents.flatMap((up, child) => (up === index ? [child] : [])),
        places: [],
        weight,
        probability: weight / total,
      };
    }),
  };
}

export function pointId(section: number): PartId {
  return `p${section}`;
}

export function pointAt(tree: SectionTree, section: number): SeparablePoint {
  const point = tree.sections[section]?.point;
  if (!point) throw new Error(`section ${section} hangs on no point`);
  return point;
}

/** Probabilities as the tree has them. */
export function priorOf(tree: SectionTree): number[] {
  return tree.sections.map(({ probability }) => probability);
}
