import { readFileSync } from 'node:fs';
import { gzipSync } from 'node:zlib';
import { at, textOf } from './workspace.mjs';

const folder = 'dist/apps/web';

/** The scripts that a chunk pulls in before it can run, itself included. */
function closure(manifest, key, seen = new Set()) {
  if (seen.has(key)) return seen;
  seen.add(key);
  for (const next of manifest[key].imports ?? []) closure(manifest, next, seen);
  return seen;
}

const kilobytes = (files) =>
  files.reduce((sum, file) => sum + gzipSync(readFileSync(at(folder, file))).length, 0) / 1024;

/** Weight of the scripts that the first page and the trace's page need, gzip. */
export function bundleRows() {
  const manifest = JSON.parse(textOf(folder, '.vite/manifest.json'));
  const keys = Object.keys(manifest);
  const entry = keys.find((key) => manifest[key].isEntry);
  const trace = keys.find((key) => key.endsWith('features/trace/trace-page.tsx'));
  const filesOf = (...chunks) =>
    [...new Set(chunks.flatMap((key) => [...closure(manifest, key)]))].map(
      (key) => manifest[key].file,
    );
  return [
    { name: 'scripts of the first page, gzip', value: kilobytes(filesOf(entry)), unit: 'KB' },
    {
      name: 'scripts of the trace route, gzip',
      value: kilobytes(filesOf(entry, trace)),
      unit: 'KB',
      target: '< 300',
    },
  ];
}
