import { lampsOnCircuit, type CircuitId, type PartId } from '@lampwright/harness';
import type { LampResult } from '../events';
import { isOverload } from '../feeds';
import { own } from '../own';
import type { TraceContext } from '../state';
import type { Change } from './change';
import { huntAgain } from './mending';

/** A circuit that overloads now holds another short; one that does not can be looked at lamp by lamp. */
export const power: Change<'circuit.powered'> = (context, event) => {
  if (isOverload(event.outcome)) return huntAgain(context, event);
  const { circuit, outcome, amps } = event;
  const lamps = own(context.lampCheck, circuit)?.lamps ?? {};
  return {
    ...context,
    lampCheck: {
      ...context.lampCheck,
      [circuit]: { outcome, ...(amps !== undefined && { amps }), lamps },
    },
  };
};

export const checkLamp: Change<'lamp.checked'> = (context, { circuit, lamp, result }) =>
  withLamps(context, circuit, { [lamp]: result });

export const lightAll: Change<'circuit.allLit'> = (context, { circuit }) => {
  const results = own(context.lampCheck, circuit)?.lamps ?? {};
  const unseen = lampsOnCircuit(context.record.plan.harness, circuit).filter(
    ({ id }) => !own(results, id),
  );
  return withLamps(context, circuit, Object.fromEntries(unseen.map(({ id }) => [id, 'lit'])));
};

function withLamps(
  context: TraceContext,
  circuit: CircuitId,
  results: Record<PartId, LampResult>,
): TraceContext {
  const before = own(context.lampCheck, circuit) ?? { outcome: null, lamps: {} };
  return {
    ...context,
    lampCheck: {
      ...context.lampCheck,
      [circuit]: { ...before, lamps: { ...before.lamps, ...results } },
    },
  };
}

export const sign: Change<'trace.signed'> = (context, event) => ({
  ...context,
  signature: {
    name: event.name.trim(),
    cause: event.cause,
    correction: event.correction,
    minutes: event.minutes,
    parts: event.parts,
    at: event.at,
    by: event.by,
  },
});
