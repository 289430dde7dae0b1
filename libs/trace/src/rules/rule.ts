import type { EventOf } from '../eventOf';
import type { TraceEventType } from '../events';
import type { Refusal, RefusalReason, TraceContext } from '../state';

/** Says why an event may not happen now, in the step where it belongs; `null` where it may. */
export type Rule<Type extends TraceEventType> = (
  context: TraceContext,
  event: EventOf<Type>,
) => Refusal | null;

/** A refusal for a reason, with the ids that it is about. */
export function refuse(reason: RefusalReason, ids: readonly string[]): Refusal {
  return { reason, ids: [...ids] };
}

/** A refusal when there is anything left; the things left are its facts. */
export function refuseIfAny(reason: RefusalReason, left: readonly string[]): Refusal | null {
  return left.length > 0 ? refuse(reason, left) : null;
}
