import { traceLogic, type TraceRecord } from '@lampwright/trace';
import { createActor, type ActorRefFrom } from 'xstate';

export type TraceActor = ActorRefFrom<typeof traceLogic>;

/** The trace's actor, started and fed with a record; it lives outside React. */
export function createTraceActor(record: TraceRecord): TraceActor {
  return createActor(traceLogic, { input: record }).start();
}
