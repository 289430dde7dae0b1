import { Entity, Index, OptionalProps, PrimaryKey, Property, Unique } from '@mikro-orm/core';
import type { Preferences, Role } from '@lampwright/contracts';

/** Somebody with an account. People are closed, never deleted: traces carry their names. */
@Entity({ tableName: 'person' })
export class Person {
  [OptionalProps]?: 'closed' | 'lastSignInAt';

  @PrimaryKey({ type: 'string', length: 64 })
  id: string;

  @Index()
  @Property({ type: 'string', length: 100 })
  name: string;

  /** Always in lower case. */
  @Unique()
  @Property({ type: 'string', length: 254 })
  email: string;

  @Property({ type: 'string', length: 20 })
  role: Role;

  @Property({ type: 'string', length: 200, hidden: true, lazy: true })
  passwordHash: string;

  @Property({ type: 'boolean' })
  closed: boolean = false;

  @Property({ type: 'json' })
  preferences: Preferences;

  @Property({ type: 'datetime', nullable: true })
  lastSignInAt: Date | null = null;

  @Property({ type: 'datetime' })
  createdAt: Date;
}
