/** What this program uses of a better-sqlite3 connection. */
export interface SqliteConnection {
  pragma(source: string, options?: { simple?: boolean }): unknown;
  backup(destination: string): Promise<unknown>;
}

export const BUSY_TIMEOUT_MS = 5000;

/**
 * Prepares a fresh connection. The time-out comes first: asking for WAL may itself have to wait for another process.
 */
export function prepareConnection(
  connection: SqliteConnection,
  done: (error: unknown, connection: SqliteConnection) => void,
): void {
  try {
    connection.pragma(`busy_timeout = ${BUSY_TIMEOUT_MS}`);
    connection.pragma('journal_mode = WAL');
    connection.pragma('synchronous = NORMAL');
    connection.pragma('foreign_keys = ON');
    done(null, connection);
  } catch (error) {
    done(error, connection);
  }
}
