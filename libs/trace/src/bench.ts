import {
  energisedSections,
  sectionTree,
  type CircuitId,
  type SectionTree,
} from '@lampwright/harness';
import type { Harness, PartId } from '@lampwright/harness';

const trees = new WeakMap<Harness, Map<CircuitId, SectionTree>>();

/** The circuit as it is built, with every separable point, whatever a person can reach. Kept per plan. */
export function benchTree(harness: Harness, circuit: CircuitId): SectionTree {
  let byCircuit = trees.get(harness);
  if (!byCircuit) trees.set(harness, (byCircuit = new Map()));
  let tree = byCircuit.get(circuit);
  if (!tree) byCircuit.set(circuit, (tree = sectionTree(harness, circuit)));
  return tree;
}

/** Whether two sets of open points leave the very same sections of the circuit energised. */
export function energisesTheSame(
  tree: SectionTree,
  a: readonly PartId[],
  b: readonly PartId[],
): boolean {
  const other = energisedSections(tree, b);
  return energisedSections(tree, a).every((on, index) => on === other[index]);
}

/** The open points that part a section from the inlet, inlet side first. */
export function openTowardsInlet(
  tree: SectionTree,
  section: number,
  open: readonly PartId[],
): PartId[] {
  const parting: PartId[] = [];
  let at = tree.sections[section];
  while (at) {
    if (at.point && open.includes(at.point.partId)) parting.unshift(at.point.partId);
    at = at.parent === null ? undefined : tree.sections[at.parent];
  }
  return parting;
}
