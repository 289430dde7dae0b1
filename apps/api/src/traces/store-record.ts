import type { EntityManager } from '@mikro-orm/better-sqlite';
import { openTrace, type TraceRecord } from '@lampwright/trace';
import { Person } from '../people/person.entity';
import { PlanRevision } from '../plans/plan-revision.entity';
import { Trailer } from '../trailers/trailer.entity';
import { applySummary } from './apply-summary';
import { storeEvents } from './store-events';
import { Trace } from './trace.entity';

/** Stores a whole record whose trailer, people and plan revision are stored already. The caller flushes. */
export async function storeRecord(
  em: EntityManager,
  record: TraceRecord,
  receivedAt: Date,
): Promise<void> {
  const { format, id, trailer, plan, settings, author, openedAt, events } = record;
  const trace = em.create(Trace, {
    id,
    format,
    trailer: em.getReference(Trailer, trailer.id),
    trailerSnapshot: trailer,
    settings,
    planRevision: await em.findOneOrFail(PlanRevision, { plan: plan.id, number: plan.revision }),
    author: em.getReference(Person, author),
    openedAt: new Date(openedAt),
    step: 'intake',
  });
  storeEvents(em, trace, events, receivedAt);
  applySummary(trace, openTrace(record));
}
