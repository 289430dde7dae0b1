import { Entity, ManyToOne, PrimaryKey, Property, Unique, type Rel } from '@mikro-orm/core';
import type { TraceEventType } from '@lampwright/trace';
import { Person } from '../people/person.entity';
import { Trace } from './trace.entity';

/** One event of a trace, exactly as it was sent. Rows are added, never changed. */
@Entity({ tableName: 'trace_event' })
@Unique({ properties: ['trace', 'device', 'seq'] })
@Unique({ properties: ['trace', 'position'] })
export class StoredEvent {
  /** Made on the device; the same id is the same event for ever. */
  @PrimaryKey({ type: 'string', length: 64 })
  id: string;

  @ManyToOne({ entity: () => Trace, deleteRule: 'restrict' })
  trace: Rel<Trace>;

  @Property({ type: 'string', length: 64 })
  device: string;

  @Property({ type: 'integer' })
  seq: number;

  /** Order within the trace, from 1, over all devices. */
  @Property({ type: 'integer' })
  position: number;

  @Property({ type: 'string', length: 40 })
  type: TraceEventType;

  /** The event's own data, without the envelope. */
  @Property({ type: 'json' })
  body: Record<string, unknown>;

  /** By the device's clock, as sent. */
  @Property({ type: 'string', length: 40 })
  at: string;

  @Property({ type: 'datetime' })
  receivedAt: Date;

  @ManyToOne({ entity: () => Person, deleteRule: 'restrict' })
  author: Rel<Person>;
}
