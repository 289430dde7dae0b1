import { createPlanner } from '@lampwright/isolation';
import { appendEvent, nextSeq } from '../appendEvent';
import type { TraceEvent, TraceEventBody } from '../events';
import type { TraceRecord } from '../record';
import { openTrace, type TraceLog } from '../traceLog';
import { PlayedTrailer } from './PlayedTrailer';
import { Player } from './Player';
import { playedId } from './playedId';
import type { PlayOptions, TraceStory } from './story';

/** No trace of a real trailer comes near; beyond it the story cannot be told to its end. */
const MOST_EVENTS = 2000;

/**
 * Plays a trace to its signature: someone follows the planner, finds what the story hides, repairs it and says
 * truthfully what they see. The same record, story and options give the same events. They go on from the events that
 * the record has.
 *
 * @throws Error where the story cannot be told: a tank trailer, a circuit that the plan does not have.
 */
export function playTrace(
  record: TraceRecord,
  story: TraceStory,
  options: PlayOptions = {},
): TraceEvent[] {
  const { detection = 1, seed = 1, device = 'played', secondsPerEvent = 20 } = options;
  const trailer = new PlayedTrailer(story.shorts, detection, seed);
  const player = new Player(story, trailer, options.choose ?? createPlanner());
  const events: TraceEvent[] = [];
  let log = openTrace(record);
  for (let body = player.move(log); body; body = player.move(log)) {
    if (events.length === MOST_EVENTS) throw new Error(`${record.id} does not come to an end.`);
    const event = stamp(log, body, device, secondsPerEvent);
    log = appended(log, event);
    events.push(event);
  }
  return events;
}

function stamp(
  log: TraceLog,
  body: TraceEventBody,
  device: string,
  secondsPerEvent: number,
): TraceEvent {
  const { id, openedAt, author, events } = log.record;
  const seq = nextSeq(log, device);
  const at = Date.parse(openedAt) + (events.length + 1) * secondsPerEvent * 1000;
  return {
    ...body,
    id: playedId(id, seq, at),
    device,
    seq,
    at: new Date(at).toISOString(),
    by: author,
  };
}

function appended(log: TraceLog, event: TraceEvent): TraceLog {
  const outcome = appendEvent(log, event);
  if (outcome.ok) return outcome.log;
  const { reason, ids = [] } = outcome.refusal;
  throw new Error(`The story stops at ${event.type}: ${reason} ${ids.join(', ')}`.trim());
}
