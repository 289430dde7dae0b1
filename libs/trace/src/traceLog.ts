import { initialTransition, transition } from 'xstate';
import type { TraceEvent } from './events';
import type { TraceRecord } from './record';
import { refusalFor } from './refusalFor';
import { ruleForUndo } from './ruleForUndo';
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
  const before: TraceSnapshot[] = [];
  const effective: TraceEvent[] = [];
  const skipped: SkippedEvent[] = [];
  for (const event of events) {
    const refusal = refusalToStand(snapshot, effective, event);
    if (refusal) {
      skipped.push({ id: event.id, refusal });
    } else if (event.type === 'event.undone') {
      effective.pop();
      snapshot = before.pop() ?? snapshot;
    } else {
      effective.push(event);
      before.push(snapshot);
      snapshot = step(snapshot, event);
    }
  }
  return { record, snapshot, effective, skipped };
}

/** Why an event cannot stand after those that do, its number in the device's order aside. */
export function refusalToStand(
  snapshot: TraceSnapshot,
  effective: readonly TraceEvent[],
  event: TraceEvent,
): Refusal | null {
  const isUndo = event.type === 'event.undone' && snapshot.status === 'active';
  return isUndo ? ruleForUndo(effective, event) : refusalFor(snapshot, event);
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
