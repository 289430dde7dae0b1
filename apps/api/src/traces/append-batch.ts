import type { AppendResult } from '@lampwright/contracts';
import { appendEvent, readTraceEvent, type TraceEvent, type TraceLog } from '@lampwright/trace';

/** What became of a batch: the answers, the events to store, and the trace with them. */
export interface BatchOutcome {
  results: AppendResult[];
  accepted: TraceEvent[];
  log: TraceLog;
}

/**
 * Feeds events to the machine one after the other. After a refusal those that follow were recorded on top of
 * something that never happened: they are refused as well. `foreign` are ids that other traces hold.
 */
export function appendBatch(
  log: TraceLog,
  events: readonly TraceEvent[],
  foreign: ReadonlySet<string>,
): BatchOutcome {
  const outcome: BatchOutcome = { results: [], accepted: [], log };
  let refused = false;
  for (const event of events) {
    const result = appendOne(outcome, event, foreign, refused);
    refused ||= result.outcome === 'refused';
    outcome.results.push(result);
  }
  return outcome;
}

function appendOne(
  outcome: BatchOutcome,
  event: TraceEvent,
  foreign: ReadonlySet<string>,
  refused: boolean,
): AppendResult {
  const { id } = event;
  if (foreign.has(id) || !readTraceEvent(event).ok)
    return { id, outcome: 'refused', refusal: { reason: 'malformed', ids: [id] } };
  const appended = appendEvent(outcome.log, event);
  if (appended.ok && appended.duplicate) return { id, outcome: 'duplicate' };
  if (refused) {
    return { id, outcome: 'refused', refusal: { reason: 'outOfSequence', ids: [event.device] } };
  }
  if (!appended.ok) return { id, outcome: 'refused', refusal: appended.refusal };
  outcome.log = appended.log;
  outcome.accepted.push(event);
  return { id, outcome: 'accepted' };
}
