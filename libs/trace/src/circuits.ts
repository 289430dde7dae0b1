import { lampsOnCircuit, type CircuitId, type Part } from '@lampwright/harness';
import { isOverload } from './feeds';
import { own } from './own';
import type { TraceContext } from './state';

/** Whether the plan has such a circuit. */
export function isCircuit(context: TraceContext, circuit: CircuitId): boolean {
  return context.record.plan.harness.circuits.some(({ id }) => id === circuit);
}

/** Every circuit that has shown the fault in this trace, in the order of the complaint, then of the plan. */
export function suspectedCircuits(context: TraceContext): CircuitId[] {
  const all = context.record.plan.harness.circuits.map(({ id }) => id);
  const ordered = [...context.suspects, ...all.filter((id) => !context.suspects.includes(id))];
  return ordered.filter((circuit) => hasShown(context, circuit));
}

function hasShown(context: TraceContext, circuit: CircuitId): boolean {
  return (
    isOverload(own(context.confirmed, circuit)?.outcome) ||
    isOverload(own(context.wiggled, circuit)) ||
    context.powerUps.some((powerUp) => powerUp.circuit === circuit && isOverload(powerUp.seen))
  );
}

/** The circuits that showed the fault and have not yet held since the last repair. */
export function circuitsToProve(context: TraceContext): CircuitId[] {
  return suspectedCircuits(context).filter((circuit) => own(context.proven, circuit) !== 'holds');
}

/** Circuits that light lamps, each with its lamps, in the order of the plan. */
export function circuitsWithLamps(context: TraceContext): { circuit: CircuitId; lamps: Part[] }[] {
  const { harness } = context.record.plan;
  return harness.circuits
    .map(({ id }) => ({ circuit: id, lamps: lampsOnCircuit(harness, id) }))
    .filter(({ lamps }) => lamps.length > 0);
}
