import { initialTransition, transition } from 'xstate';
import { effectiveEvents } from './effectiveEvents';
import type { TraceEvent } from './events';
import type { TraceRecord } from './record';
import { refusalFor } from './refusalFor';
import type { Refusal } from './state';
import { traceMachine, type TraceSnapshot } from './traceMachine';

/** A trace with what its events add up to. Plain values: a log is never changed, a new one is made. */
export interface TraceLog {
  readonly record: TraceRecord;
  /** Where the machine stands after the events that count. */
  readonly snapshot: TraceSnapshot;
  /** The events that count, oldest first: accepted and not taken back. */
  readonly effective: readonly TraceEvent[];
  /** Events of a stored record that this program would not accept; empty for a log that it wrote itself. */
  readonly skipped: readonly SkippedEvent[];
}

export interface SkippedEvent {
  id: string;
  refusal: Refusal;
}

/** The state of a record with all its events. Never throws; what it cannot follow it names in `skipped`. O(events). */
export function foldTrace(record: TraceRecord): TraceLog {
  const { events, ...surroundings } = record;
  let [snapshot] = initialTransition(traceMachine, surroundings);
  const effective: TraceEvent[] = [];
  const skipped: SkippedEvent[] = [];
  for (const event of effectiveEvents(events)) {
    const refusal = refusalFor(snapshot, event);
    if (refusal) {
      skipped.push({ id: event.id, refusal });
    } else {
      snapshot = step(snapshot, event);
      effective.push(event);
    }
  }
  return { record, snapshot, effective, skipped };
}

/** Opens a trace for appending, from its record with the events that it has so far. */
export function openTrace(record: TraceRecord): TraceLog {
  return foldTrace(record);
}

/** One transition, without side effects. */
export function step(snapshot: TraceSnapshot, event: TraceEvent): TraceSnapshot {
  const [next] = transition(traceMachine, snapshot, event);
  return next;
}
