import {
  Entity,
  Index,
  ManyToOne,
  OptionalProps,
  PrimaryKey,
  Property,
  Unique,
  type Rel,
} from '@mikro-orm/core';
import type { BodyType, SecondSource } from '@lampwright/trace';
import { Plan } from '../plans/plan.entity';

/** A trailer of the yard. */
@Entity({ tableName: 'trailer' })
export class Trailer {
  [OptionalProps]?: 'version';

  @PrimaryKey({ type: 'string', length: 64 })
  id: string;

  /** The number painted on it. */
  @Unique()
  @Property({ type: 'string', length: 40 })
  unit: string;

  @Index()
  @Property({ type: 'string', length: 30 })
  bodyType: BodyType;

  @Property({ type: 'double' })
  lengthMetres: number;

  @Property({ type: 'double' })
  widthMetres: number;

  @Property({ type: 'integer' })
  year: number;

  @Property({ type: 'string', length: 20, nullable: true })
  plate: string | null;

  @Property({ type: 'string', length: 100 })
  fleet: string;

  @Property({ type: 'text' })
  notes: string;

  @Property({ type: 'json' })
  secondSources: SecondSource[];

  @Property({ type: 'boolean' })
  abs: boolean;

  @ManyToOne({ entity: () => Plan, nullable: true, deleteRule: 'restrict' })
  plan: Rel<Plan> | null;

  @Property({ type: 'integer', version: true })
  version: number = 1;
}
