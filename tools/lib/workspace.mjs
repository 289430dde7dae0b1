import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The root of the workspace. */
export const root = fileURLToPath(new URL('../..', import.meta.url));

/** A path below the root. */
export const at = (...parts) => join(root, ...parts);

/** Text of a file below the root, or an empty string where there is none. */
export const textOf = (...parts) =>
  existsSync(at(...parts)) ? readFileSync(at(...parts), 'utf8') : '';

const sources = ['apps/api', 'apps/web', 'libs', 'tools'];
const settings = ['package-lock.json', 'nx.json', 'tsconfig.base.json'];

function* files(folder) {
  for (const entry of readdirSync(folder, { withFileTypes: true })) {
    const path = join(folder, entry.name);
    if (entry.isDirectory()) yield* files(path);
    else yield path;
  }
}

/** Changes whenever a file that the build reads does: names, sizes and times, which takes milliseconds to collect. */
export function fingerprint() {
  const hash = createHash('sha256');
  const paths = [
    ...settings.map((name) => at(name)),
    ...sources.flatMap((name) => [...files(at(name))]),
  ];
  for (const path of paths.sort()) {
    const { size, mtimeMs } = statSync(path);
    hash.update(`${path}\0${size}\0${mtimeMs}\n`);
  }
  return hash.digest('hex');
}
