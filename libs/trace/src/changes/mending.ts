import { knownSectionOf, situation } from '../situation';
import type { TraceContext } from '../state';
import { isOverload } from '../feeds';
import type { EventOf } from '../eventOf';
import type { Change } from './change';
import { powerUpOf, withPowerUp } from './narrowing';

export const inspect: Change<'place.inspected'> = (context, { place, method, finding, note }) => ({
  ...context,
  inspected: [
    ...context.inspected,
    { place, method, finding, ...(note !== undefined && { note }) },
  ],
  found: finding === 'found' ? place : context.found,
});

/** Back to narrowing. With one section known and all of it clear, the readings and the eyes disagree. */
export const resume: Change<'narrowing.resumed'> = (context) => ({
  ...context,
  contradiction: knownSectionOf(context) === null ? null : 'sectionClear',
});

export const repair: Change<'repair.made'> = (
  context,
  { place, cause, correction, parts, note },
) => ({
  ...context,
  found: place,
  repairs: [
    ...context.repairs,
    { place, cause, correction, parts, ...(note !== undefined && { note }) },
  ],
  proven: {},
});

/** Power again after a repair: what still overloads opens the next hunt. */
export const prove: Change<'proof.read'> = (context, event) =>
  isOverload(event.outcome)
    ? huntAgain(context, event)
    : {
        ...withPowerUp(context, powerUpOf(context, event, context.open)),
        proven: { ...context.proven, [event.circuit]: event.outcome },
      };

/** The next hunt, on the circuit that still overloads. What held in the hunts before stays cleared. */
export function huntAgain(
  context: TraceContext,
  event: EventOf<'proof.read'> | EventOf<'circuit.powered'>,
): TraceContext {
  const hunting: TraceContext = {
    ...context,
    hunt: context.hunt + 1,
    circuit: event.circuit,
    chosen: null,
    found: null,
    inspected: [],
    proven: {},
    lampCheck: {},
    maxFaults: Math.max(1, context.maxFaults - 1),
  };
  const next = withPowerUp(hunting, powerUpOf(hunting, event, context.open));
  const contradicted = situation(next)?.belief.contradicted;
  return { ...next, contradiction: contradicted ? 'nothingLeft' : null };
}

export const reconnect: Change<'point.reconnected'> = (context, { point }) => ({
  ...context,
  open: context.open.filter((each) => each !== point),
});
