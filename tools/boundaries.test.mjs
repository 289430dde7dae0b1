import { spawnSync } from 'node:child_process';
import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { at } from './lib/workspace.mjs';

const forbidden = [
  ['libs/harness/src/a', 'libs/isolation/src/index', 'harness-is-the-bottom'],
  ['libs/isolation/src/b', 'libs/trace/src/index', 'isolation-knows-harness'],
  ['libs/trace/src/c', 'libs/contracts/src/index', 'trace-knows-isolation-and-harness'],
  ['libs/trace/src/d', 'libs/demo/src/index', 'trace-knows-isolation-and-harness'],
  ['apps/web/src/app/e', 'apps/api/src/index', 'web-knows-no-api'],
  ['apps/api/src/f', 'apps/web/src/index', 'api-knows-no-web'],
  ['apps/web/src/features/yard/g', 'apps/web/src/features/trace/h', 'feature-to-feature'],
  ['apps/web/src/ui/i', 'apps/web/src/features/trace/h', 'shared-knows-no-feature'],
  ['apps/web/src/ui/j', 'libs/trace/src/fold', 'no-library-by-its-inside'],
];

const allowed = [
  ['libs/isolation/src/k', 'libs/harness/src/index'],
  ['libs/trace/src/l', 'libs/isolation/src/index'],
  ['apps/web/src/features/trace/m', 'libs/contracts/src/index'],
  ['apps/api/src/traces/n', 'libs/trace/src/index'],
  ['apps/web/src/features/trace/o', 'apps/web/src/features/trace/h'],
];

/** Runs the workspace's own rules over a small tree with one file for each import of the tables. */
function violations() {
  const folder = mkdtempSync(join(tmpdir(), 'lampwright-boundaries-'));
  const write = (path, text) => {
    mkdirSync(dirname(join(folder, path)), { recursive: true });
    writeFileSync(join(folder, path), text);
  };
  try {
    write('package.json', '{"name":"fixture"}');
    write('tsconfig.base.json', '{"compilerOptions":{"moduleResolution":"Bundler"}}');
    for (const [from, to] of [...forbidden, ...allowed]) {
      const up = '../'.repeat(from.split('/').length - 1);
      write(`${to}.ts`, 'export const there = 1;\n');
      write(`${from}.ts`, `import { there } from '${up}${to}';\nexport const here = there;\n`);
    }
    const { stdout } = spawnSync(
      at('node_modules/.bin/depcruise'),
      ['--config', at('.dependency-cruiser.cjs'), '--output-type', 'json', 'apps', 'libs'],
      { cwd: folder, encoding: 'utf8' },
    );
    return JSON.parse(stdout).summary.violations;
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

describe('the direction of imports', () => {
  const found = violations();
  const rulesBroken = (from, to) =>
    found
      .filter((row) => row.from === `${from}.ts` && row.to === `${to}.ts`)
      .map((row) => row.rule);

  it.each(forbidden)('%s may not import %s: %s', (from, to, rule) => {
    expect(rulesBroken(from, to)).toContainEqual({ name: rule, severity: 'error' });
  });

  it.each(allowed)('%s may import %s', (from, to) => {
    expect(rulesBroken(from, to)).toEqual([]);
  });
});
