import type { CircuitId } from '@lampwright/harness';
import { circuitsWithLamps, suspectedCircuits } from '../circuits';
import { own } from '../own';
import { pointsToCloseFirst } from '../pointsToCloseFirst';
import type { Refusal, TraceContext } from '../state';
import { refuse, refuseIfAny, type Rule } from './rule';
import { ruleForCircuits, ruleForLamp, ruleForPlace } from './things';

export const ruleForRepair: Rule<'repair.made'> = (context, event) =>
  ruleForPlace(context, event.place);

/** A proof that leaves the repaired place without power proves nothing. */
export const ruleForProof: Rule<'proof.read'> = (context, event) =>
  (suspectedCircuits(context).includes(event.circuit)
    ? null
    : refuse('unknownCircuit', [event.circuit])) ??
  refuseIfAny('repairNotEnergised', pointsToCloseFirst(context, event.circuit));

export const ruleForReconnecting: Rule<'point.reconnected'> = (context, event) =>
  context.open.includes(event.point) ? null : refuse('notOpen', [event.point]);

export const ruleForPowering: Rule<'circuit.powered'> = (context, event) =>
  ruleForCircuits(context, [event.circuit]);

export const ruleForLampResult: Rule<'lamp.checked'> = (context, event) =>
  ruleForLit(context, event.circuit) ?? ruleForLamp(context, event.circuit, event.lamp);

export const ruleForAllLit: Rule<'circuit.allLit'> = (context, event) =>
  ruleForLit(context, event.circuit);

/** A lamp is judged only while its circuit is on. */
function ruleForLit(context: TraceContext, circuit: CircuitId): Refusal | null {
  return (
    ruleForCircuits(context, [circuit]) ??
    (own(context.lampCheck, circuit)?.outcome ? null : refuse('circuitsLeft', [circuit]))
  );
}

export const ruleForLampCheck: Rule<'lampCheck.finished'> = (context) => {
  const circuits = circuitsWithLamps(context);
  const dead = circuits.filter(({ circuit }) => !own(context.lampCheck, circuit)?.outcome);
  const unseen = circuits.flatMap(({ circuit, lamps }) => {
    const results = own(context.lampCheck, circuit)?.lamps ?? {};
    return lamps.map(({ id }) => id).filter((id) => !own(results, id));
  });
  return (
    refuseIfAny(
      'circuitsLeft',
      dead.map(({ circuit }) => circuit),
    ) ?? refuseIfAny('lampsLeft', [...new Set(unseen)])
  );
};

/** A signature says who, why and how long. */
export const ruleForSignature: Rule<'trace.signed'> = (_context, event) =>
  refuseIfAny(
    'malformed',
    [
      ['name', event.name.trim() !== ''],
      ['cause', event.cause.trim() !== ''],
      ['minutes', Number.isFinite(event.minutes) && event.minutes >= 0],
    ].flatMap(([field, good]) => (good ? [] : [String(field)])),
  );
