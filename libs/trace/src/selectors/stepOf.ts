import type { Step, TraceContext } from '../state';
import type { TraceLog } from '../traceLog';
import type { TraceTag } from '../traceMachine';

/** The step that the trace is at. */
export function stepOf(log: TraceLog): Step {
  const { value } = log.snapshot;
  return typeof value === 'string' ? value : (Object.keys(value)[0] as Step);
}

/** What is known after the events that count. */
export function contextOf(log: TraceLog): TraceContext {
  return log.snapshot.context;
}

/** Whether the trace is where the tag says. */
export function isAt(log: TraceLog, tag: TraceTag): boolean {
  return log.snapshot.hasTag(tag);
}
