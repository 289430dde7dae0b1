import type { EntityManager } from '@mikro-orm/better-sqlite';
import { BUSY_TIMEOUT_MS } from './connection';
import { withSqliteConnection } from './sqlite-connection';

/** Pragmas that the program's safety rests on. `synchronous` 1 is NORMAL. */
const EXPECTED: Record<string, string | number> = {
  busy_timeout: BUSY_TIMEOUT_MS,
  journal_mode: 'wal',
  synchronous: 1,
  foreign_keys: 1,
};

/** Throws at start-up when the connection is not as it must be. */
export async function assertConnection(em: EntityManager): Promise<void> {
  await withSqliteConnection(em, (connection) => {
    for (const [pragma, expected] of Object.entries(EXPECTED)) {
      const actual = connection.pragma(pragma, { simple: true });
      if (actual !== expected) {
        throw new Error(`SQLite's ${pragma} is ${String(actual)}; it must be ${expected}.`);
      }
    }
  });
}
