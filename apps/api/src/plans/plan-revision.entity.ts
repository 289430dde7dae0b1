import { Entity, ManyToOne, PrimaryKey, Property, Unique, type Rel } from '@mikro-orm/core';
import type { Harness } from '@lampwright/harness';
import { Person } from '../people/person.entity';
import { Plan } from './plan.entity';

/** One state of a plan. It never changes: traces rest on it. */
@Entity({ tableName: 'plan_revision' })
@Unique({ properties: ['plan', 'number'] })
export class PlanRevision {
  @PrimaryKey({ type: 'string', length: 64 })
  id: string;

  @ManyToOne({ entity: () => Plan, deleteRule: 'restrict' })
  plan: Rel<Plan>;

  /** Counts from 1 within the plan. */
  @Property({ type: 'integer' })
  number: number;

  /** Large, so read only where it is needed. */
  @Property({ type: 'json', lazy: true })
  harness: Harness;

  @ManyToOne({ entity: () => Person, nullable: true, deleteRule: 'restrict' })
  author: Rel<Person> | null;

  @Property({ type: 'datetime' })
  createdAt: Date;
}
