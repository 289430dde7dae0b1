import { Entity, ManyToOne, OptionalProps, PrimaryKey, Property, type Rel } from '@mikro-orm/core';
import { Person } from '../people/person.entity';

/** A refresh token that was replaced a moment ago: its answer may have been lost on the way. */
export interface RetiredToken {
  hash: string;
  /** Milliseconds since 1970. */
  until: number;
}

/** One device on which a person is signed in. */
@Entity({ tableName: 'session' })
export class Session {
  [OptionalProps]?: 'retired' | 'endedAt';

  @PrimaryKey({ type: 'string', length: 64 })
  id: string;

  @ManyToOne({ entity: () => Person, index: true, deleteRule: 'cascade' })
  person: Rel<Person>;

  /** SHA-256 of the refresh token that is valid now. */
  @Property({ type: 'string', length: 64, hidden: true })
  tokenHash: string;

  @Property({ type: 'json', hidden: true })
  retired: RetiredToken[] = [];

  @Property({ type: 'string', length: 100 })
  deviceName: string;

  @Property({ type: 'datetime' })
  createdAt: Date;

  @Property({ type: 'datetime' })
  lastUsedAt: Date;

  @Property({ type: 'datetime' })
  expiresAt: Date;

  @Property({ type: 'datetime', nullable: true })
  endedAt: Date | null = null;
}
