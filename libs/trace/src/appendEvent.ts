import type { TraceEvent } from './events';
import { isTraceEventType } from './eventTypes';
import { refusalFor } from './refusalFor';
import { refuse } from './rules/rule';
import { sameJson } from './sameJson';
import type { Refusal } from './state';
import { foldTrace, refusalToStand, step, type TraceLog } from './traceLog';

export type AppendOutcome =
  { ok: true; log: TraceLog; duplicate?: boolean } | { ok: false; refusal: Refusal };

/**
 * Adds one event, or says why not; a refused event leaves the log as it was. One transition an event; taking back folds
 * anew. The same event sent twice is a duplicate and changes nothing.
 */
export function appendEvent(log: TraceLog, event: TraceEvent): AppendOutcome {
  const known = log.record.events.find(({ id }) => id === event.id);
  if (known) {
    return sameJson(known, event)
      ? { ok: true, log, duplicate: true }
      : { ok: false, refusal: refuse('malformed', [event.id]) };
  }
  const refusal = refusalToAdd(log, event);
  if (refusal) return { ok: false, refusal };
  const record = { ...log.record, events: [...log.record.events, event] };
  if (event.type === 'event.undone') return { ok: true, log: foldTrace(record) };
  return {
    ok: true,
    log: {
      record,
      snapshot: step(log.snapshot, event),
      effective: [...log.effective, event],
      skipped: log.skipped,
    },
  };
}

function refusalToAdd(log: TraceLog, event: TraceEvent): Refusal | null {
  const { snapshot, effective } = log;
  if (!isTraceEventType(event.type) || snapshot.status !== 'active') {
    return refusalFor(snapshot, event);
  }
  const expected = nextSeq(log, event.device);
  if (event.seq !== expected) return refuse('outOfSequence', [event.device, String(expected)]);
  return refusalToStand(snapshot, effective, event);
}

/** The number that a device gives its next event of this trace. */
export function nextSeq(log: TraceLog, device: string): number {
  return (log.record.events.findLast((event) => event.device === device)?.seq ?? 0) + 1;
}

/** Whether there is an event to take back. */
export function canUndo(log: TraceLog): boolean {
  return log.snapshot.status === 'active' && log.effective.length > 0;
}
