import { mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { MikroORM } from '@mikro-orm/better-sqlite';
import { Migration } from '@mikro-orm/migrations';
import { hashPassword } from '../auth/passwords';
import { Session } from '../auth/session.entity';
import { seedDemoYard } from '../demo/seed-demo-yard';
import { Person } from '../people/person.entity';
import { storeRecord } from '../traces/store-record';
import { shortRecord } from '../testing/short-record';
import { assertConnection } from './assert-connection';
import { migrate } from './migrate';
import { MIGRATIONS } from './migrations';
import { ormConfig } from './orm.config';

const NOW = new Date('2026-12-01T08:00:00.000Z');
let folder: string;
let file: string;
let orm: MikroORM;

beforeEach(async () => {
  folder = mkdtempSync(join(tmpdir(), 'lampwright-db-'));
  file = join(folder, 'lampwright.sqlite');
  orm = await MikroORM.init(ormConfig(file, { acquireTimeoutMillis: 300 }));
});
afterEach(async () => {
  await orm.close();
  rmSync(folder, { recursive: true, force: true });
});

const rows = (sql: string) => orm.em.getConnection().execute<Record<string, unknown>[]>(sql);

/** Puts rows into every table, the nullable links included. */
async function fill(): Promise<void> {
  await migrate(orm, file, NOW);
  const em = orm.em.fork();
  await em.transactional(async (inside) => {
    await seedDemoYard(inside, NOW);
    await storeRecord(inside, shortRecord(), NOW);
    const person = await inside.findOneOrFail(Person, { role: 'lead' });
    inside.create(Session, {
      id: 'session',
      person,
      tokenHash: await hashPassword('token'),
      deviceName: 'Tablet',
      createdAt: NOW,
      lastUsedAt: NOW,
      expiresAt: NOW,
    });
  });
  await rows(`update plan_revision set author_id = (select id from person limit 1)`);
}

/** Every table with all its rows as they stand, foreign keys and all. */
async function contents(): Promise<Record<string, unknown[]>> {
  const tables = await rows(
    `select name from sqlite_master where type = 'table' and name not like 'sqlite_%' and name <> 'mikro_orm_migrations' order by name`,
  );
  const result: Record<string, unknown[]> = {};
  for (const { name } of tables)
    result[String(name)] = await rows(`select * from ${name} order by 1, 2`);
  return result;
}

/** Rebuilds every parent table the way SQLite asks for: copy, drop, rename. */
class RebuildParents extends Migration {
  override async up(): Promise<void> {
    for (const table of ['person', 'plan', 'plan_revision', 'trailer', 'trace']) {
      const [row] = await this.execute(`select sql from sqlite_master where name = '${table}'`);
      const indexes = await this.execute(
        `select sql from sqlite_master where type = 'index' and tbl_name = '${table}' and sql is not null`,
      );
      const sql = String(row!.sql).replace(
        /create table [`"]?\w+[`"]?/i,
        `create table ${table}_new`,
      );
      this.addSql(sql);
      this.addSql(`insert into ${table}_new select * from ${table}`);
      this.addSql(`drop table ${table}`);
      this.addSql(`alter table ${table}_new rename to ${table}`);
      for (const index of indexes) this.addSql(String(index.sql));
    }
  }
}
const rebuild = { name: '29990101-rebuild-parents', class: RebuildParents };

async function reopenWith(migrations: typeof MIGRATIONS): Promise<void> {
  await orm.close();
  orm = await MikroORM.init(ormConfig(file, { migrations, acquireTimeoutMillis: 300 }));
}

describe('the migrations', () => {
  it('make the very tables that the entities describe', async () => {
    await migrate(orm, file, NOW);
    expect(await orm.schema.getUpdateSchemaSQL({ wrap: false })).toBe('');
  });

  it('run once', async () => {
    expect((await migrate(orm, file, NOW)).applied).toEqual(MIGRATIONS.map(({ name }) => name));
    expect(await migrate(orm, file, NOW)).toEqual({ applied: [], backup: null });
  });

  it('that rebuild parents keep every row of every table and every link', async () => {
    await fill();
    const before = await contents();
    expect(Object.entries(before).filter(([, all]) => all.length === 0)).toEqual([]);
    await reopenWith([...MIGRATIONS, rebuild]);

    const { applied, backup } = await migrate(orm, file, NOW);

    expect(applied).toEqual([rebuild.name]);
    expect(await contents()).toEqual(before);
    expect(await rows('pragma foreign_key_check')).toEqual([]);
    await expect(assertConnection(orm.em)).resolves.toBeUndefined();
    expect(backup).toBe(join(folder, 'backups', readdirSync(join(folder, 'backups'))[0]!));
  });

  it('leave a copy of what was there before, which opens', async () => {
    await fill();
    const before = await contents();
    await reopenWith([...MIGRATIONS, rebuild]);
    const { backup } = await migrate(orm, file, NOW);
    await rows('delete from session');
    await orm.close();
    orm = await MikroORM.init(ormConfig(backup!));
    expect(await contents()).toEqual(before);
  });

  it('would lose rows without foreign keys being off: the danger is real', async () => {
    await fill();
    await reopenWith([...MIGRATIONS, rebuild]);
    const outcome = await orm.migrator.up().then(
      async () => (await rows('select * from session')).length,
      () => 'failed',
    );
    expect(outcome).not.toBe(1);
  });

  it('that fail change nothing, and leave foreign keys on', async () => {
    await fill();
    const before = await contents();
    class Broken extends Migration {
      override up(): void {
        this.addSql('delete from session');
        this.addSql('insert into nowhere values (1)');
      }
    }
    await reopenWith([...MIGRATIONS, { name: '29990101-broken', class: Broken }]);
    await expect(migrate(orm, file, NOW)).rejects.toThrow(/nowhere/);
    expect(await contents()).toEqual(before);
    await expect(assertConnection(orm.em)).resolves.toBeUndefined();
  });

  it('that leave a link to nowhere are refused, and say where the copy is', async () => {
    await fill();
    class Orphans extends Migration {
      override up(): void {
        this.addSql('delete from plan');
      }
    }
    await reopenWith([...MIGRATIONS, { name: '29990101-orphans', class: Orphans }]);
    await expect(migrate(orm, file, NOW)).rejects.toThrow(/point nowhere.*backups/);
  });
});

describe('the connection', () => {
  it('is as the program needs it', async () => {
    await expect(assertConnection(orm.em)).resolves.toBeUndefined();
    expect(await rows('pragma journal_mode')).toEqual([{ journal_mode: 'wal' }]);
  });

  it.each(['foreign_keys = OFF', 'busy_timeout = 10', 'synchronous = FULL'])(
    'is refused with %s',
    async (pragma) => {
      await rows(`pragma ${pragma}`);
      await expect(assertConnection(orm.em)).rejects.toThrow(pragma.split(' ')[0]);
    },
  );

  it('asked for by a second fork inside a transaction fails instead of hanging', async () => {
    await migrate(orm, file, NOW);
    const attempt = orm.em.fork().transactional(async (em) => {
      await em.count(Person);
      await orm.em.fork().count(Person);
    });
    await expect(attempt).rejects.toThrow(/acquir|timeout/i);
    expect(await orm.em.fork().count(Person)).toBe(0);
  });

  it('serves transactions one after the other', async () => {
    await fill();
    const names = ['one', 'two', 'three'];
    await Promise.all(
      names.map((name) =>
        orm.em.fork().transactional(async (em) => {
          const person = await em.findOneOrFail(Person, { role: 'lead' });
          person.name += ` ${name}`;
        }),
      ),
    );
    const lead = await orm.em.fork().findOneOrFail(Person, { role: 'lead' });
    for (const name of names) expect(lead.name).toContain(name);
  });
});
