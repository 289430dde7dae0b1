/** `npm run bench`: measures what the product promises and prints it as a table; nothing fails on time. */
import { spawn } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { runnerImport } from 'vite';
import { checkNode, install } from './lib/prepare.mjs';
import { bundleRows } from './lib/bundle.mjs';
import { say } from './lib/say.mjs';
import { at, textOf } from './lib/workspace.mjs';

const port = 45_310;

/** Seconds from `npm start` to the first healthy answer; the server is ended again. */
async function secondsToReady(data) {
  const from = performance.now();
  const child = spawn('npm', ['start'], {
    cwd: at('.'),
    env: { ...process.env, PORT: String(port), LAMPWRIGHT_DATA: data, LAMPWRIGHT_LOG: 'silent' },
    stdio: 'ignore',
    detached: true,
  });
  const ended = new Promise((resolve) => child.once('exit', resolve));
  try {
    for (;;) {
      const answer = await fetch(`http://127.0.0.1:${port}/api/health`).catch(() => null);
      if (answer?.ok) return (performance.now() - from) / 1000;
      if (child.exitCode !== null) throw new Error('npm start ended before it was ready');
      await new Promise((resolve) => setTimeout(resolve, 50));
    }
  } finally {
    process.kill(-child.pid, 'SIGTERM');
    await ended;
  }
}

async function startRows() {
  const data = mkdtempSync(join(tmpdir(), 'lampwright-bench-'));
  try {
    const first = await secondsToReady(data);
    const second = await secondsToReady(data);
    return [
      {
        name: 'npm start, built, empty data folder (seeds the demo yard)',
        value: first,
        unit: 's',
      },
      { name: 'npm start, second time', value: second, unit: 's', target: '< 5' },
    ];
  } finally {
    rmSync(data, { recursive: true, force: true });
  }
}

function testRows() {
  const seconds = Number(textOf('dist/npm-test-seconds'));
  return seconds > 0
    ? [{ name: 'npm test, its last run here', value: seconds, unit: 's', target: '< 360' }]
    : [];
}

async function plannerRows() {
  const { alias } = (await runnerImport(at('tools/vitest.shared.mts'))).module;
  const { module } = await runnerImport(at('libs/isolation/bench/planner.bench.mts'), {
    resolve: { alias },
  });
  return module.plannerRows();
}

function table(rows) {
  const number = (value) => (typeof value === 'number' ? value.toPrecision(4) : String(value));
  const cells = rows.map(({ name, value, unit, target }) => [
    name,
    number(value),
    unit,
    target ?? '',
  ]);
  const lines = [['measure', 'value', 'unit', 'target'], ...cells];
  const widths = [0, 1, 2, 3].map((column) =>
    Math.max(...lines.map((line) => line[column].length)),
  );
  for (const line of lines) say(line.map((cell, column) => cell.padEnd(widths[column])).join('  '));
}

checkNode();
install();
// The server comes first: it builds what the bundle rows then weigh.
const start = await startRows();
table([...(await plannerRows()), ...bundleRows(), ...start, ...testRows()]);
