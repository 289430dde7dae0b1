import { Entity, Index, PrimaryKey, Property } from '@mikro-orm/core';

/** A harness document through its revisions; the columns are those of the newest. */
@Entity({ tableName: 'plan' })
export class Plan {
  @PrimaryKey({ type: 'string', length: 64 })
  id: string;

  @Index()
  @Property({ type: 'string', length: 200 })
  name: string;

  /** Number of the newest revision, from 1. */
  @Property({ type: 'integer' })
  revision: number;

  @Property({ type: 'integer' })
  parts: number;

  @Property({ type: 'integer' })
  circuits: number;

  @Property({ type: 'datetime' })
  createdAt: Date;

  @Property({ type: 'datetime' })
  updatedAt: Date;
}
