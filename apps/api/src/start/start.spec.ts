import { execFileSync, spawn, type ChildProcess } from 'node:child_process';
import { createServer, type Server } from 'node:net';
import { once } from 'node:events';
import { mkdtempSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { explainFailure } from './explain-failure';
import { StartError } from '../common/start-error';
import { assertNodeVersion, assertWritable } from './preconditions';

const workspace = resolve(__dirname, '../../../..');
const out = 'dist/api-start-test';
let folder: string;

beforeAll(() => {
  execFileSync(process.execPath, ['tools/build-api.mjs', out], { cwd: workspace, stdio: 'pipe' });
  folder = mkdtempSync(join(tmpdir(), 'lampwright-start-'));
}, 120_000);
afterAll(() => {
  rmSync(join(workspace, out), { recursive: true, force: true });
  rmSync(folder, { recursive: true, force: true });
});

interface Run {
  process: ChildProcess;
  output(): string;
  ended: Promise<number | null>;
}

/** Starts the built program as `npm start` does. */
function start(env: NodeJS.ProcessEnv): Run {
  const child = spawn(process.execPath, [join(out, 'apps/api/src/main.js')], {
    cwd: workspace,
    env: { PATH: process.env.PATH, LAMPWRIGHT_DATA: folder, LAMPWRIGHT_DEMO: 'yard', ...env },
  });
  let output = '';
  for (const stream of [child.stdout, child.stderr]) stream.on('data', (text) => (output += text));
  return {
    process: child,
    output: () => output,
    ended: once(child, 'exit').then(([code]) => code as number | null),
  };
}

async function ready(run: Run): Promise<string> {
  while (!/ready at (\S+)/.test(run.output())) {
    await Promise.race([
      once(run.process.stdout!, 'data'),
      run.ended.then(() => Promise.reject(new Error(run.output()))),
    ]);
  }
  return /ready at (\S+)/.exec(run.output())![1]!;
}

describe('the program', () => {
  it('says where it is and how to sign in, answers, and ends with 0 when it is told to', async () => {
    const run = start({ PORT: '0' });
    const address = await ready(run);
    expect(run.output()).toMatch(/maren@thornwick-yard\.example/);
    expect((await fetch(`${address}/api/health`)).status).toBe(200);
    run.process.kill('SIGTERM');
    expect(await run.ended).toBe(0);
    expect(readdirSync(folder)).toContain('lampwright.sqlite');
    expect(readdirSync(folder)).not.toContain('lampwright.sqlite-wal');
  }, 60_000);

  it('says that its port is taken', async () => {
    const other: Server = createServer().listen(0);
    await once(other, 'listening');
    const { port } = other.address() as { port: number };
    const run = start({ PORT: String(port) });
    expect(await run.ended).toBe(1);
    expect(run.output()).toContain(`Port ${port} is taken by another program.`);
    other.close();
  }, 60_000);

  it('says that its data folder cannot be written', async () => {
    const file = join(folder, 'a-file');
    writeFileSync(file, '');
    const run = start({ LAMPWRIGHT_DATA: join(file, 'data') });
    expect(await run.ended).toBe(1);
    expect(run.output()).toMatch(/The data folder .* cannot be written .* LAMPWRIGHT_DATA/);
  }, 60_000);

  it('says that its database is damaged', async () => {
    const data = mkdtempSync(join(tmpdir(), 'lampwright-damaged-'));
    writeFileSync(
      join(data, 'lampwright.sqlite'),
      'this is no database, though it is long enough to be read',
    );
    const run = start({ LAMPWRIGHT_DATA: data, PORT: '0' });
    expect(await run.ended).toBe(1);
    expect(run.output()).toMatch(/The database file is damaged/);
    rmSync(data, { recursive: true });
  }, 60_000);

  it('says what is wrong with a setting', async () => {
    const run = start({ PORT: 'http' });
    expect(await run.ended).toBe(1);
    expect(run.output()).toMatch(/^Lampwright did not start\. PORT is "http"/);
    expect(run.output()).not.toContain('    at ');
  }, 60_000);
});

it.each(['18.19.0', '20.18.3', '20.0.0'])('refuses Node.js %s', (version) => {
  expect(() => assertNodeVersion(version)).toThrow(/needs 20\.19 or newer/);
});

it.each(['20.19.0', '20.20.2', '22.1.0'])('takes Node.js %s', (version) => {
  expect(() => assertNodeVersion(version)).not.toThrow();
});

it('makes the data folder', () => {
  expect(() => assertWritable(join(folder, 'new', 'folder'))).not.toThrow();
});

it('keeps the stack of a failure that nobody foresaw, and spares people that of others', () => {
  expect(explainFailure(new Error('odd'))).toMatch(/odd\n {4}at /);
  expect(explainFailure(new StartError('Do this.'))).toBe('Lampwright did not start. Do this.');
  expect(explainFailure(Object.assign(new Error('x'), { code: 'EROFS' }))).toMatch(/read-only/);
});
