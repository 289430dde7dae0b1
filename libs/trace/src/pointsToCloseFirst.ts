import type { CircuitId, PartId } from '@lampwright/harness';
import { benchTree, openTowardsInlet } from './bench';
import { circuitsToProve } from './circuits';
import { sectionsOf } from './places';
import type { TraceContext } from './state';

/**
 * Points to close before a circuit can be proven, inlet side first; without a circuit, before any can be. With a
 * repaired place: the open points that part it from the inlet. With nothing repaired in this hunt, as when handling
 * made the short go away: every open point of the circuit, since nobody knows where it was.
 */
export function pointsToCloseFirst(context: TraceContext, circuit?: CircuitId): PartId[] {
  const circuits = circuit === undefined ? circuitsToProve(context) : [circuit];
  return [...new Set(circuits.flatMap((each) => pointsOfCircuit(context, each)))];
}

function pointsOfCircuit(context: TraceContext, circuit: CircuitId): PartId[] {
  const tree = benchTree(context.record.plan.harness, circuit);
  const sections =
    context.found === null && context.circuit === circuit
      ? tree.sections.map(({ index }) => index)
      : context.repairs.flatMap(({ place }) => sectionsOf(tree, place));
  return sections.flatMap((section) => openTowardsInlet(tree, section, context.open));
}
