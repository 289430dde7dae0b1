import { EntityManager } from '@mikro-orm/better-sqlite';
import { Injectable } from '@nestjs/common';
import type { AppendEventsResponse } from '@lampwright/contracts';
import { defaultSettings, openTrace, TRACE_FORMAT, type TraceEvent } from '@lampwright/trace';
import { Clock } from '../common/clock';
import { FIELD_MESSAGES } from '../common/messages';
import { ProblemException } from '../common/problem.exception';
import { Person } from '../people/person.entity';
import { PlanRevision } from '../plans/plan-revision.entity';
import { Trailer } from '../trailers/trailer.entity';
import { appendBatch } from './append-batch';
import { applySummary } from './apply-summary';
import type { OpenTraceDto } from './dto/open-trace.dto';
import { assertEnvelopes } from './event-envelope';
import { loadRecord } from './load-record';
import { storeEvents } from './store-events';
import { StoredEvent } from './stored-event.entity';
import { Trace } from './trace.entity';

/** Opening traces and adding to them. Each is one transaction, so a repeat sees all of the first or nothing. */
@Injectable()
export class TraceWritingService {
  constructor(
    private readonly em: EntityManager,
    private readonly clock: Clock,
  ) {}

  /** Opens a trace; the same request again changes nothing. */
  async open({ id, trailerId }: OpenTraceDto, author: Person): Promise<void> {
    await this.em.transactional(async (em) => {
      const known = await em.findOne(Trace, id);
      if (known) {
        assertSame(known, trailerId, author);
        return;
      }
      const trailer = await em.findOneOrFail(Trailer, trailerId, { populate: ['plan'] });
      if (trailer.bodyType === 'tank') throw new ProblemException('tankTrailer');
      if (!trailer.plan) throw new ProblemException('noPlan');
      const { plan, unit, bodyType, secondSources, abs } = trailer;
      em.create(Trace, {
        id,
        format: TRACE_FORMAT,
        trailer,
        trailerSnapshot: { id: trailerId, unit, bodyType, secondSources, abs },
        settings: defaultSettings,
        planRevision: await em.findOneOrFail(PlanRevision, { plan, number: plan.revision }),
        author: em.getReference(Person, author.id),
        openedAt: this.clock.now(),
        step: 'intake',
      });
    });
  }

  /**
   * Adds events to a trace. Whoever may run traces may go on with anybody's: one technician often hands a trailer to
   * the next, and every event says whose it is.
   */
  async append(
    id: string,
    events: readonly TraceEvent[],
    person: Person,
  ): Promise<AppendEventsResponse> {
    assertEnvelopes(events, person.id);
    return this.em.transactional(async (em) => {
      const trace = await em.findOneOrFail(Trace, id, { populate: ['circuits'] });
      const log = openTrace(await loadRecord(em, trace));
      const outcome = appendBatch(log, events, await idsElsewhere(em, trace, events));
      if (outcome.accepted.length > 0) {
        storeEvents(em, trace, outcome.accepted, this.clock.now());
        applySummary(trace, outcome.log);
      }
      return { results: outcome.results, step: trace.step };
    });
  }
}

function assertSame(known: Trace, trailerId: string, author: Person): void {
  if (known.trailer.id === trailerId && known.author.id === author.id) return;
  throw ProblemException.field('conflict', 'id', 'otherTrailer', FIELD_MESSAGES.otherTrailer);
}

async function idsElsewhere(
  em: EntityManager,
  trace: Trace,
  events: readonly TraceEvent[],
): Promise<Set<string>> {
  const found = await em.find(
    StoredEvent,
    { id: { $in: events.map(({ id }) => id) }, trace: { $ne: trace.id } },
    { fields: ['id'] },
  );
  return new Set(found.map(({ id }) => id));
}
