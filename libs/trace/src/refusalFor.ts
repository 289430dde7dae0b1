import { getNextTransitions } from 'xstate';
import { isTraceEventType } from './eventTypes';
import type { TraceEvent, TraceEventType } from './events';
import { meaningsFor } from './meanings';
import * as beginning from './rules/beginning';
import * as ending from './rules/ending';
import * as narrowing from './rules/narrowing';
import { refuse, type Rule } from './rules/rule';
import type { Refusal, TraceContext } from './state';
import type { TraceSnapshot } from './traceMachine';

/** Why the machine would refuse an event where it stands; `null` where it takes it. */
export function refusalFor(snapshot: TraceSnapshot, event: TraceEvent): Refusal | null {
  if (!isTraceEventType(event.type)) return refuse('malformed', [String(event.type)]);
  if (snapshot.status !== 'active') return refuse('fixed', [snapshot.context.record.id]);
  if (snapshot.can(event)) return null;
  const belongs = getNextTransitions(snapshot).some(({ eventType }) => eventType === event.type);
  return belongs ? byRule(snapshot.context, event) : outOfStep(snapshot, event.type);
}

/** The step does not take such events: it may be waiting for something else first. */
function outOfStep(snapshot: TraceSnapshot, type: TraceEventType): Refusal {
  const { context } = snapshot;
  if (snapshot.hasTag('contradicted')) return refuse('contradictionOpen', meaningsFor(context));
  if (snapshot.hasTag('coolDown') && type === 'reading.taken') {
    return refuse('coolDownNeeded', [String(context.overloads)]);
  }
  if (snapshot.matches('reconnect')) return refuse('pointsStillOpen', context.open);
  return refuse('notInThisStep', [type]);
}

const rules: { [Type in TraceEventType]?: Rule<Type> } = {
  'intake.stated': beginning.ruleForStatement,
  'caution.ticked': beginning.ruleForTick,
  'safety.confirmed': beginning.ruleForSafety,
  'circuit.confirmed': beginning.ruleForConfirming,
  'confirm.finished': beginning.ruleForConfirmed,
  'wiggle.read': beginning.ruleForWiggle,
  'feed.changed': beginning.ruleForFeed,
  'trace.abandoned': beginning.ruleForAbandoning,
  'circuit.chosen': narrowing.ruleForCircuit,
  'point.barred': narrowing.ruleForBarring,
  'point.allowed': narrowing.ruleForAllowing,
  'damage.seen': narrowing.ruleForDamage,
  'powerUp.chosen': narrowing.ruleForChoice,
  'reading.taken': narrowing.ruleForReading,
  'contradiction.explained': narrowing.ruleForExplanation,
  'place.inspected': narrowing.ruleForInspecting,
  'narrowing.resumed': narrowing.ruleForResuming,
  'repair.made': ending.ruleForRepair,
  'proof.read': ending.ruleForProof,
  'point.reconnected': ending.ruleForReconnecting,
  'circuit.powered': ending.ruleForPowering,
  'lamp.checked': ending.ruleForLampResult,
  'circuit.allLit': ending.ruleForAllLit,
  'lampCheck.finished': ending.ruleForLampCheck,
  'trace.signed': ending.ruleForSignature,
};

function byRule(context: TraceContext, event: TraceEvent): Refusal {
  // The table pairs each type with its own rule, which a lookup by a union cannot express.
  const rule = rules[event.type] as Rule<TraceEventType> | undefined;
  return rule?.(context, event) ?? refuse('notInThisStep', [event.type]);
}
