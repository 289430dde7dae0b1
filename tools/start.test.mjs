import { spawn, spawnSync } from 'node:child_process';
import { once } from 'node:events';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { at } from './lib/workspace.mjs';

/** Runs `npm start`'s script until it ends, and answers with its exit code and what it said. */
async function start(env) {
  const child = spawn(process.execPath, [at('tools/start.mjs')], {
    env: { ...process.env, ...env },
    stdio: ['ignore', 'ignore', 'pipe'],
  });
  let said = '';
  child.stderr.on('data', (chunk) => (said += chunk));
  const [code] = await once(child, 'exit');
  return { code, said };
}

describe('npm start', () => {
  let folder;
  beforeEach(() => (folder = mkdtempSync(join(tmpdir(), 'lampwright-start-'))));
  afterEach(() => rmSync(folder, { recursive: true, force: true }));

  it('says which port is taken and how to choose another', async () => {
    const other = createServer().listen(0);
    await once(other, 'listening');
    const { port } = other.address();
    const { code, said } = await start({ PORT: String(port), LAMPWRIGHT_DATA: folder });
    other.close();
    expect(code).toBe(1);
    expect(said).toContain(`Port ${port} cannot be used: another program has it`);
    expect(said).toContain(`PORT=${port + 1} npm start`);
    expect(said).not.toMatch(/\n\s+at /);
  });

  it.each(['eighty', '0', '70000', '30.5'])('refuses PORT=%s', async (PORT) => {
    const { code, said } = await start({ PORT, LAMPWRIGHT_DATA: folder });
    expect(code).toBe(1);
    expect(said).toContain(`PORT is "${PORT}"`);
  });

  it('names a data folder that cannot be written', async () => {
    const file = join(folder, 'a-file');
    writeFileSync(file, '');
    const { code, said } = await start({ PORT: '45997', LAMPWRIGHT_DATA: join(file, 'var') });
    expect(code).toBe(1);
    expect(said).toContain('The data folder');
    expect(said).toContain('cannot be written');
  });

  it('names the Node.js that it wants', () => {
    const prepare = JSON.stringify(at('tools/lib/prepare.mjs'));
    const { status, stderr } = spawnSync(
      process.execPath,
      ['-e', `import(${prepare}).then((tools) => tools.checkNode('18.20.4'))`],
      { encoding: 'utf8' },
    );
    expect(status).toBe(1);
    expect(stderr).toContain('Node.js 18.20.4 is too old');
    expect(stderr).toContain('Install Node.js 20.19.0 or newer');
  });
});
