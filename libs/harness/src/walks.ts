import { circuitTree, type CircuitNode, type CircuitTree } from './circuitTree';
import { PartNotOnCircuitError } from './errors';
import type { CircuitId, Harness, Part, PartId } from './harness';

/**
 * Every part that the circuit reaches, the inlet included, feed first. O(parts + runs).
 *
 * @throws UnknownCircuitError
 */
export function partsOnCircuit(harness: Harness, circuit: CircuitId): Part[] {
  return circuitTree(harness, circuit).nodes.map((node) => node.part);
}

/**
 * The lamps that the circuit lights, feed first. O(parts + runs).
 *
 * @throws UnknownCircuitError
 */
export function lampsOnCircuit(harness: Harness, circuit: CircuitId): Part[] {
  return partsOnCircuit(harness, circuit).filter((part) => part.kind === 'lamp');
}

/**
 * Every part that `part` feeds, directly or through others, feed first and without itself. It follows the wires alone:
 * a lamp that has a run going on counts what follows as downstream, though unplugging the lamp would not part it.
 * O(parts found).
 *
 * @throws PartNotOnCircuitError
 */
export function downstream(tree: CircuitTree, part: PartId): Part[] {
  const found: Part[] = [];
  const ahead = [nodeOf(tree, part)];
  for (let node = ahead.pop(); node; node = ahead.pop()) {
    if (node.part.id !== part) found.push(node.part);
    for (const run of node.runs.toReversed()) ahead.push(nodeOf(tree, run.to));
  }
  return found;
}

/**
 * The nodes from `part` (first) to the inlet (last); each node's `feed` is the run to the next. O(length).
 *
 * @throws PartNotOnCircuitError
 */
export function pathToInlet(tree: CircuitTree, part: PartId): CircuitNode[] {
  const path = [nodeOf(tree, part)];
  for (let feed = path[0]?.feed; feed; feed = path.at(-1)?.feed) {
    path.push(nodeOf(tree, feed.from));
  }
  return path;
}

function nodeOf(tree: CircuitTree, part: PartId): CircuitNode {
  const node = tree.nodeByPart.get(part);
  if (!node) throw new PartNotOnCircuitError(part, tree.circuit);
  return node;
}
