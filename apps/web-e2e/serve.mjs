/** Serves the built product on an empty data folder, so that every run begins with a fresh demo yard. */
import { rmSync } from 'node:fs';
import { fileURLToPath } from 'node:url';

const root = fileURLToPath(new URL('../..', import.meta.url));
const data = `${root}dist/e2e/data`;

rmSync(data, { recursive: true, force: true });
process.env.LAMPWRIGHT_DATA = data;
process.env.LAMPWRIGHT_LOG ??= 'warn';
await import(`${root}dist/apps/api/apps/api/src/main.js`);
