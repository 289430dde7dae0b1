/** `npm test`: format, lint, types, unit, API and browser tests; prints how many ran. */
import { rmSync, writeFileSync } from 'node:fs';
import { chromium } from './lib/chromium.mjs';
import { checkNode, checkWritable, install, run } from './lib/prepare.mjs';
import { readReports } from './lib/reports.mjs';
import { say } from './lib/say.mjs';
import { at } from './lib/workspace.mjs';

checkNode();
checkWritable(at('.'), 'The workspace');
install();
const browser = chromium();

rmSync(at('dist/reports'), { recursive: true, force: true });

const nx = (targets) =>
  run(
    'npx',
    ['nx', 'run-many', '-t', ...targets, '--parallel=2', '--nxBail=false', '--output-style=static'],
    { CHROMIUM_PATH: browser },
  );

const steps = [
  ['build', () => nx(['build'])],
  // Browser tests mostly wait for a hand's pace; the others work meanwhile on what they leave free.
  [
    'format, lint, types, unit, API and browser tests',
    () => nx(['e2e', 'test', 'typecheck', 'lint', 'format', 'boundaries', 'unused']),
  ],
];

const begun = performance.now();
const broken = [];
for (const [name, step] of steps) {
  const from = performance.now();
  say(`\n== ${name}`);
  const held = step();
  if (!held) broken.push(name);
  say(
    `== ${name}: ${held ? 'holds' : 'FAILED'} (${((performance.now() - from) / 1000).toFixed(0)} s)`,
  );
}

writeFileSync(at('dist/npm-test-seconds'), String((performance.now() - begun) / 1000));

const reports = readReports();
say('');
for (const { project, passed, failed, skipped } of reports) {
  say(
    `${project.padEnd(12)} ${String(passed).padStart(5)} passed ${failed} failed ${skipped} skipped`,
  );
}
const sum = (key) => reports.reduce((total, report) => total + report[key], 0);
if (broken.length > 0) say(`\nNot held: ${broken.join('; ')}`);
// A step that breaks without a failing test (format, lint, types) counts as one failure.
const failed = Math.max(sum('failed'), broken.length);
const skipped = sum('skipped');
say(`${sum('passed')} passed, ${failed} failed${skipped > 0 ? `, ${skipped} skipped` : ''}`);
process.exit(failed > 0 ? 1 : 0);
