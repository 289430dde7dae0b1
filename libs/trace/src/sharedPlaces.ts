import {
  indexHarness,
  partsOnCircuit,
  type CircuitId,
  type Harness,
  type PlaceRef,
} from '@lampwright/harness';
import { ANOTHER_SHORT_FACTOR } from '@lampwright/isolation';
import { circuitsToProve } from './circuits';
import type { TraceContext } from './state';

/**
 * How much likelier a place is that carries every circuit that trips. Either one damage has reached them all there, or
 * each has a short of its own; the latter weighs `ANOTHER_SHORT_FACTOR` for each further short (ours, no source), so the
 * former weighs its inverse beside it.
 */
const SHARED_FACTOR = 1 / ANOTHER_SHORT_FACTOR;

/**
 * By place: what to multiply its weight with for the circuits that trip and do not yet hold again. 1 everywhere while
 * that is a single circuit: a find that cleared the others has taken the reason away. O(parts + runs) once.
 */
export function sharedFactor(context: TraceContext): (ref: PlaceRef) => number {
  const circuits = circuitsToProve(context);
  if (circuits.length < 2) return () => 1;
  const shared = placesOnAll(context.record.plan.harness, circuits);
  const factor = SHARED_FACTOR ** (circuits.length - 1);
  return (ref) => (shared(ref) ? factor : 1);
}

function placesOnAll(harness: Harness, circuits: readonly CircuitId[]): (ref: PlaceRef) => boolean {
  const { runById } = indexHarness(harness);
  const parts = circuits.map(
    (circuit) => new Set(partsOnCircuit(harness, circuit).map(({ id }) => id)),
  );
  return ({ kind, id }) =>
    kind === 'run'
      ? circuits.every((circuit) => runById.get(id)?.circuits.includes(circuit))
      : parts.every((on) => on.has(id));
}
