import react from '@vitejs/plugin-react';
import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';
import { alias } from '../../tools/vitest.shared.mts';

const repo = fileURLToPath(new URL('../..', import.meta.url));
const here = fileURLToPath(new URL('.', import.meta.url));

/** Libraries that change together and that every screen needs. */
const vendor = [
  { name: 'react', test: /node_modules[\\/](react|react-dom|scheduler)[\\/]/ },
  { name: 'router', test: /node_modules[\\/]react-router/ },
  { name: 'look', test: /node_modules[\\/](@chakra-ui|@ark-ui|@zag-js|@emotion|@pandacss|stylis)/ },
  { name: 'words', test: /node_modules[\\/](i18next|react-i18next)[\\/]/ },
];

/** Modules that only export: what no screen uses of them is left out of its chunk. */
const onlyExports = /\/(apps\/web\/src\/(ui|lib|drawing)|libs\/[^/]+\/src)\/[^?]*\.tsx?$/;

export default defineConfig({
  root: here,
  cacheDir: `${repo}node_modules/.vite/web`,
  plugins: [react()],
  resolve: { alias },
  server: { proxy: { '/api': 'http://127.0.0.1:3000' } },
  build: {
    outDir: `${repo}dist/apps/web`,
    emptyOutDir: true,
    manifest: true,
    rolldownOptions: {
      treeshake: { moduleSideEffects: (id) => !onlyExports.test(id) },
      output: { codeSplitting: { groups: vendor } },
    },
  },
  test: {
    globals: true,
    testTimeout: 60_000,
    // One start of the component library for all files, not one for each: a third of the time.
    isolate: false,
    setupFiles: [`${here}src/testing/setup.ts`],
    // A document is built for the tests of components alone: it costs a second a file.
    projects: [
      {
        extends: true,
        test: { name: 'rules', environment: 'node', include: ['src/**/*.test.ts'] },
      },
      {
        extends: true,
        test: {
          name: 'screens',
          environment: 'jsdom',
          include: ['src/**/*.test.tsx'],
          setupFiles: [`${here}src/testing/setup-document.ts`],
        },
      },
    ],
  },
});
