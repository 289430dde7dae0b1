import { randomUUID } from 'node:crypto';
import { demoYard } from '@lampwright/demo';
import { defaultSettings, TRACE_FORMAT, type TraceRecord } from '@lampwright/trace';
import { Tablet } from './tablet';

/** A short record on the demo yard, without playing a whole trace. */
export function shortRecord(): TraceRecord {
  const trailer = demoYard.trailers[0]!;
  const { id, unit, bodyType, secondSources, abs } = trailer;
  const author = demoYard.people[1]!.id;
  const plan = demoYard.plans.find((each) => each.id === trailer.planId)!;
  const tablet = new Tablet(author);
  return {
    format: TRACE_FORMAT,
    id: randomUUID(),
    trailer: { id, unit, bodyType, secondSources, abs },
    plan: { id: plan.id, revision: 1, harness: plan.harness },
    settings: defaultSettings,
    author,
    openedAt: '2026-12-01T08:30:00.000Z',
    events: [
      tablet.intake('tail', 'stop'),
      tablet.says({ type: 'caution.ticked', caution: 'chocks' }),
    ],
  };
}
