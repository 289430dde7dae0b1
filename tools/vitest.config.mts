import { defineConfig } from 'vitest/config';

export default defineConfig({
  test: { globals: true, include: ['**/*.test.mjs'], testTimeout: 60_000 },
});
