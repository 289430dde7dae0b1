import type { EventOf } from '../eventOf';
import type { TraceEventType } from '../events';
import type { TraceContext } from '../state';

/** What an event that may happen makes of what is known; never changes the context it is given. */
export type Change<Type extends TraceEventType> = (
  context: TraceContext,
  event: EventOf<Type>,
) => TraceContext;
