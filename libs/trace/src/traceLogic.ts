import { fromTransition } from 'xstate';
import { appendEvent } from './appendEvent';
import type { TraceEvent } from './events';
import type { TraceRecord } from './record';
import type { Refusal } from './state';
import { openTrace, type TraceLog } from './traceLog';

/** What an actor of `traceLogic` holds. */
export interface TraceActorState {
  log: TraceLog;
  /** Why the last event was refused; `null` once another was taken. */
  lastRefusal: Refusal | null;
}

/** A trace as an actor for a screen: send it events, select from `snapshot.context`. It has no side effects. */
export const traceLogic = fromTransition<TraceActorState, TraceEvent, never, TraceRecord>(
  (state, event) => {
    const outcome = appendEvent(state.log, event);
    return outcome.ok
      ? { log: outcome.log, lastRefusal: null }
      : { log: state.log, lastRefusal: outcome.refusal };
  },
  ({ input }) => ({ log: openTrace(input), lastRefusal: null }),
);
