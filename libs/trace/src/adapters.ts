import { assign } from 'xstate';
import type { Change } from './changes/change';
import type { TraceEvent, TraceEventType } from './events';
import type { EventOf } from './eventOf';
import type { Rule } from './rules/rule';
import type { TraceContext } from './state';

/** What a guard or an action is handed. */
export interface Now {
  context: TraceContext;
  event: TraceEvent;
}

function is<Type extends TraceEventType>(event: TraceEvent, type: Type): event is EventOf<Type> {
  return event.type === type;
}

/** A guard from a rule: passes where the rule does not refuse, and `when` holds of the event if given. */
export function allows<Type extends TraceEventType>(
  type: Type,
  rule: Rule<Type>,
  when: (event: EventOf<Type>, context: TraceContext) => boolean = () => true,
) {
  return ({ context, event }: Now): boolean =>
    is(event, type) && rule(context, event) === null && when(event, context);
}

/** A guard on what is known alone, for transitions without an event. */
export function where(holds: (context: TraceContext) => boolean) {
  return ({ context }: { context: TraceContext }): boolean => holds(context);
}

/** An action from a change. */
export function applies<Type extends TraceEventType>(type: Type, change: Change<Type>) {
  return assign<TraceContext, TraceEvent, undefined, TraceEvent, never>(({ context, event }) =>
    is(event, type) ? change(context, event) : context,
  );
}
