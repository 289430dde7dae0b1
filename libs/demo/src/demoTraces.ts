import { defaultSettings, playTrace, TRACE_FORMAT } from '@lampwright/trace';
import type { TraceRecord, TraceTrailer } from '@lampwright/trace';
import { demoYard } from './demoYard';
import type { DemoTrace } from './finishedTraces';

/** How long a person at a trailer takes from one answer to the next, on the whole. Common practice, no source. */
const SECONDS_PER_EVENT = 40;

/**
 * The finished traces of the demo yard, signed, played by a person who follows the planner. On the first revision of
 * each plan and the settings that a shop starts with. The same records every time.
 */
export function demoTraces(): TraceRecord[] {
  return demoYard.finishedTraces.map((story) => {
    const record = opened(story);
    return { ...record, events: playTrace(record, story, { secondsPerEvent: SECONDS_PER_EVENT }) };
  });
}

function opened(story: DemoTrace): TraceRecord {
  const trailer = demoYard.trailers.find(({ id }) => id === story.trailerId);
  const plan = demoYard.plans.find(({ id }) => id === trailer?.planId);
  if (!trailer || !plan) throw new Error(`trace ${story.id} has no trailer with a plan`);
  return {
    format: TRACE_FORMAT,
    id: story.id,
    trailer: asItStood(trailer),
    plan: { id: plan.id, revision: 1, harness: plan.harness },
    settings: defaultSettings,
    author: story.authorId,
    openedAt: story.openedAt,
    events: [],
  };
}

function asItStood({ id, unit, bodyType, secondSources, abs }: TraceTrailer): TraceTrailer {
  return { id, unit, bodyType, secondSources: [...secondSources], abs };
}
