import {
  Collection,
  Entity,
  Index,
  ManyToOne,
  OneToMany,
  OptionalProps,
  PrimaryKey,
  Property,
  type Rel,
} from '@mikro-orm/core';
import type { Step, TraceSettings, TraceTrailer } from '@lampwright/trace';
import { Person } from '../people/person.entity';
import { PlanRevision } from '../plans/plan-revision.entity';
import { Trailer } from '../trailers/trailer.entity';

/**
 * One hunt for a fault. Its events are the truth; the summary columns are what the fold made of them last, kept for
 * lists and filters.
 */
@Entity({ tableName: 'trace' })
export class Trace {
  [OptionalProps]?: 'complaint' | 'powerUps' | 'foundLabel' | 'signedAt' | 'events' | 'circuits';

  @PrimaryKey({ type: 'string', length: 64 })
  id: string;

  /** Format number of the events. */
  @Property({ type: 'integer' })
  format: number;

  @ManyToOne({ entity: () => Trailer, index: true, deleteRule: 'restrict' })
  trailer: Rel<Trailer>;

  /** The trailer as it stood when the trace was opened. */
  @Property({ type: 'json' })
  trailerSnapshot: TraceTrailer;

  /** The shop's settings as they stood then. */
  @Property({ type: 'json' })
  settings: TraceSettings;

  @ManyToOne({ entity: () => PlanRevision, index: true, deleteRule: 'restrict' })
  planRevision: Rel<PlanRevision>;

  @ManyToOne({ entity: () => Person, index: true, deleteRule: 'restrict' })
  author: Rel<Person>;

  @Index()
  @Property({ type: 'datetime' })
  openedAt: Date;

  /** Number of events stored; the position of the next is one more. */
  @Property({ type: 'integer' })
  events: number = 0;

  @Index()
  @Property({ type: 'string', length: 20 })
  step: Step;

  @Property({ type: 'text' })
  complaint: string = '';

  @OneToMany({ entity: () => TraceCircuit, mappedBy: 'trace', orphanRemoval: true })
  circuits = new Collection<TraceCircuit>(this);

  @Property({ type: 'integer' })
  powerUps: number = 0;

  /** Label of the place that held the short. */
  @Property({ type: 'string', length: 200, nullable: true })
  foundLabel: string | null = null;

  @Property({ type: 'datetime', nullable: true })
  signedAt: Date | null = null;
}

/** A circuit that misbehaved in a trace; a table of its own so that lists can be filtered by it. */
@Entity({ tableName: 'trace_circuit' })
export class TraceCircuit {
  @ManyToOne({ entity: () => Trace, primary: true, deleteRule: 'cascade' })
  trace: Rel<Trace>;

  @Index()
  @PrimaryKey({ type: 'string', length: 64 })
  circuit: string;

  /** Place in the order in which they were stated. */
  @Property({ type: 'integer' })
  position: number;

  /** The circuit's name in the plan. */
  @Property({ type: 'string', length: 200 })
  name: string;
}
