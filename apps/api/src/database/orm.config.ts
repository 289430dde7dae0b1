import { BetterSqliteDriver, defineConfig, type Options } from '@mikro-orm/better-sqlite';
import { Migrator } from '@mikro-orm/migrations';
import { prepareConnection } from './connection';
import { ENTITIES } from './entities';
import { MIGRATIONS } from './migrations';

/** What tests change in the configuration. */
export interface OrmOverrides {
  migrations?: typeof MIGRATIONS;
  acquireTimeoutMillis?: number;
}

const ACQUIRE_TIMEOUT_MS = 5000;

/**
 * The ORM on one SQLite file. There is one connection, so a second fork inside a transaction would wait for ever;
 * the acquire time-out turns that into an error.
 */
export function ormConfig(file: string, overrides: OrmOverrides = {}): Options {
  return defineConfig({
    driver: BetterSqliteDriver,
    dbName: file,
    entities: ENTITIES,
    extensions: [Migrator],
    migrations: {
      migrationsList: overrides.migrations ?? MIGRATIONS,
      snapshot: false,
      transactional: true,
      allOrNothing: true,
    },
    forceUtcTimezone: true,
    pool: {
      min: 1,
      max: 1,
      acquireTimeoutMillis: overrides.acquireTimeoutMillis ?? ACQUIRE_TIMEOUT_MS,
      afterCreate: prepareConnection,
    },
    logger: () => undefined,
  });
}
