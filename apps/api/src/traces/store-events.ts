import type { EntityManager } from '@mikro-orm/better-sqlite';
import type { TraceEvent } from '@lampwright/trace';
import { Person } from '../people/person.entity';
import { StoredEvent } from './stored-event.entity';
import type { Trace } from './trace.entity';

/** Adds events at the end of a trace. The caller flushes. */
export function storeEvents(
  em: EntityManager,
  trace: Trace,
  events: readonly TraceEvent[],
  receivedAt: Date,
): void {
  for (const { id, device, seq, at, by, type, ...body } of events) {
    trace.events += 1;
    em.create(StoredEvent, {
      id,
      trace,
      device,
      seq,
      position: trace.events,
      type,
      body,
      at,
      receivedAt,
      author: em.getReference(Person, by),
    });
  }
}
