import type { CircuitId } from '@lampwright/harness';
import { own } from '../own';
import type { TraceContext } from '../state';

/** Narrowing turns to a circuit. One that flickered when it was confirmed holds a short that comes and goes. */
export function onCircuit(context: TraceContext, circuit: CircuitId): TraceContext {
  const flickered = own(context.confirmed, circuit)?.outcome === 'flickers';
  return {
    ...context,
    circuit,
    chosen: null,
    comesAndGoes: context.comesAndGoes || flickered,
  };
}
