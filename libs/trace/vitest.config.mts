import { defineConfig } from 'vitest/config';
import { libraryTest } from '../../tools/vitest.shared.mts';

// Whole traces are played in the laws: seconds on a busy machine.
export default defineConfig({
  ...libraryTest,
  test: { ...libraryTest.test, testTimeout: 60_000 },
});
