// apps/api and the libraries it uses -> dist/apps/api as CommonJS; swc rewrites the @lampwright aliases.
import { execFileSync } from 'node:child_process';
import { readdirSync, rmSync, writeFileSync } from 'node:fs';

/** Another folder below the workspace may be given. */
const out = process.argv[2] ?? 'dist/apps/api';
const libraries = readdirSync('libs').map((name) => `libs/${name}/src`);

rmSync(out, { recursive: true, force: true });
execFileSync(
  process.execPath,
  [
    'node_modules/@swc/cli/bin/swc.js',
    'apps/api/src',
    ...libraries,
    ...['--config-file', 'apps/api/.swcrc'],
    ...['--out-dir', out],
    ...['--ignore', '**/*.test.ts,**/*.spec.ts,**/testing/**'],
  ],
  { stdio: 'inherit' },
);
writeFileSync(`${out}/package.json`, '{"type":"commonjs"}\n');
