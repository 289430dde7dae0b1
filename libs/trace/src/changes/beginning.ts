import { suspectedCircuits } from '../circuits';
import { isOverload, tripsAfter } from '../feeds';
import { own } from '../own';
import type { TraceContext } from '../state';
import type { Change } from './change';
import { onCircuit } from './onCircuit';

export const state: Change<'intake.stated'> = (context, event) => ({
  ...context,
  complaint: event.complaint,
  suspects: event.circuits,
  feed: event.feed,
});

export const tick: Change<'caution.ticked'> = (context, { caution }) =>
  context.cautions.includes(caution)
    ? context
    : { ...context, cautions: [...context.cautions, caution] };

export const confirm: Change<'circuit.confirmed'> = (context, { circuit, outcome, amps }) => ({
  ...context,
  confirmed: { ...context.confirmed, [circuit]: { outcome, ...(amps !== undefined && { amps }) } },
  overloads: tripsAfter(context, outcome),
});

export const wiggle: Change<'wiggle.read'> = (context, { circuit, outcome }) => ({
  ...context,
  wiggled: { ...context.wiggled, [circuit]: outcome },
  overloads: tripsAfter(context, outcome),
});

/** Narrowing begins on the first circuit that showed the fault with everything connected. */
export const beginNarrowing: Change<'confirm.finished'> = (context) => {
  const [circuit] = suspectedCircuits(context);
  return circuit === undefined ? context : onCircuit(context, circuit);
};

/** What shows only while the harness is moved comes and goes. */
export const beginAfterWiggle: Change<'wiggle.read'> = (context, event) => ({
  ...wiggle(context, event),
  circuit: event.circuit,
  comesAndGoes: true,
});

/** Whether any circuit showed the fault while everything was connected. */
export function showsFault(context: TraceContext): boolean {
  return suspectedCircuits(context).some((circuit) =>
    isOverload(own(context.confirmed, circuit)?.outcome),
  );
}

export const changeFeed: Change<'feed.changed'> = (context, { feed }) => ({ ...context, feed });

export const coolDown: Change<'coolDown.taken'> = (context) => ({ ...context, overloads: 0 });
