import type { EntityManager } from '@mikro-orm/better-sqlite';
import type { TraceEvent, TraceRecord } from '@lampwright/trace';
import { PlanRevision } from '../plans/plan-revision.entity';
import { StoredEvent } from './stored-event.entity';
import type { Trace } from './trace.entity';

/**
 * The record of a trace: its surroundings as they stood, and its events in the order of their acceptance. It is read
 * only, so the ORM need not watch it.
 */
export async function loadRecord(em: EntityManager, trace: Trace): Promise<TraceRecord> {
  const revision = await em.findOneOrFail(PlanRevision, trace.planRevision.id, {
    populate: ['harness'],
    disableIdentityMap: true,
  });
  const events = await em.find(
    StoredEvent,
    { trace },
    {
      orderBy: { position: 'asc' },
      disableIdentityMap: true,
    },
  );
  return {
    format: trace.format,
    id: trace.id,
    trailer: trace.trailerSnapshot,
    plan: { id: revision.plan.id, revision: revision.number, harness: revision.harness },
    settings: trace.settings,
    author: trace.author.id,
    openedAt: trace.openedAt.toISOString(),
    events: events.map(toTraceEvent),
  };
}

/** The event as it was sent. */
function toTraceEvent(stored: StoredEvent): TraceEvent {
  const { id, device, seq, at, type, body } = stored;
  return { id, device, seq, at, by: stored.author.id, type, ...body } as TraceEvent;
}
