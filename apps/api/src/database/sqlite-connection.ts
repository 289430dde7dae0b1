import type { EntityManager } from '@mikro-orm/better-sqlite';
import type { SqliteConnection } from './connection';

/** Lends the one connection to `use` and gives it back, whatever happens. */
export async function withSqliteConnection<T>(
  em: EntityManager,
  use: (connection: SqliteConnection) => T | Promise<T>,
): Promise<T> {
  const client = em.getKnex().client as {
    acquireConnection(): Promise<SqliteConnection>;
    releaseConnection(connection: SqliteConnection): Promise<void>;
  };
  const connection = await client.acquireConnection();
  try {
    return await use(connection);
  } finally {
    await client.releaseConnection(connection);
  }
}
