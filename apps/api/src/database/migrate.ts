import { mkdir } from 'node:fs/promises';
import { dirname, join } from 'node:path';
import type { MikroORM } from '@mikro-orm/better-sqlite';
import { withSqliteConnection } from './sqlite-connection';

/** What a migration run did. */
export interface MigrationRun {
  applied: string[];
  /** The copy made before, where there was anything to lose. */
  backup: string | null;
}

/**
 * Brings the database up to date. SQLite rebuilds a table to change it, and dropping the old one fires
 * `on delete` rules of every child unless foreign keys are off, which a transaction cannot do. So they are switched
 * off on the connection before the migrations and checked after.
 *
 * @throws when a migration fails (nothing is changed then), or when a foreign key points nowhere afterwards.
 */
export async function migrate(orm: MikroORM, file: string, now: Date): Promise<MigrationRun> {
  const pending = await orm.migrator.getPendingMigrations();
  if (pending.length === 0) return { applied: [], backup: null };

  const executed = await orm.migrator.getExecutedMigrations();
  const backup = executed.length > 0 ? await backUp(orm, file, now) : null;
  await setForeignKeys(orm, 'OFF');
  try {
    await orm.migrator.up();
  } finally {
    await setForeignKeys(orm, 'ON');
  }
  await checkForeignKeys(orm, backup);
  return { applied: pending.map(({ name }) => name), backup };
}

async function backUp(orm: MikroORM, file: string, now: Date): Promise<string> {
  const folder = join(dirname(file), 'backups');
  await mkdir(folder, { recursive: true });
  const copy = join(folder, `before-migration-${now.toISOString().replace(/[:.]/g, '-')}.sqlite`);
  await withSqliteConnection(orm.em, (connection) => connection.backup(copy));
  return copy;
}

async function setForeignKeys(orm: MikroORM, value: 'ON' | 'OFF'): Promise<void> {
  await withSqliteConnection(orm.em, (connection) => connection.pragma(`foreign_keys = ${value}`));
}

async function checkForeignKeys(orm: MikroORM, backup: string | null): Promise<void> {
  const violations = await withSqliteConnection(orm.em, (connection) =>
    connection.pragma('foreign_key_check'),
  );
  if (!Array.isArray(violations) || violations.length > 0) {
    const copy = backup ? ` The database as it was before is kept in ${backup}.` : '';
    throw new Error(`A migration left foreign keys that point nowhere.${copy}`);
  }
}
