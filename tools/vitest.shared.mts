import { fileURLToPath } from 'node:url';
import type { ViteUserConfig } from 'vitest/config';

const repo = fileURLToPath(new URL('..', import.meta.url));

const packages: [name: string, path: string][] = [
  ['@lampwright/harness/testing', 'libs/harness/src/testing/index.ts'],
  ['@lampwright/harness', 'libs/harness/src/index.ts'],
  ['@lampwright/isolation', 'libs/isolation/src/index.ts'],
  ['@lampwright/trace/testing', 'libs/trace/src/testing/index.ts'],
  ['@lampwright/trace', 'libs/trace/src/index.ts'],
  ['@lampwright/contracts', 'libs/contracts/src/index.ts'],
  ['@lampwright/demo', 'libs/demo/src/index.ts'],
];

/** The workspace's own packages, for Vite and Vitest; the same table as `paths` in tsconfig.base.json. */
export const alias = packages.map(([name, path]) => ({
  find: new RegExp(`^${name}$`),
  replacement: `${repo}${path}`,
}));

/** Vitest settings of a pure library. */
export const libraryTest: ViteUserConfig = {
  resolve: { alias },
  cacheDir: `${repo}node_modules/.vite/libs`,
  test: {
    environment: 'node',
    globals: true,
    include: ['src/**/*.test.ts'],
    // Pure code leaves nothing behind that another file could trip over.
    isolate: false,
  },
};
