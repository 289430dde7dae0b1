import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { at } from './lib/workspace.mjs';

/** Runs the script of `npm run forecast`. */
function forecast(...args) {
  const script = at('tools/forecast.mjs');
  return spawnSync(process.execPath, [script, ...args], { encoding: 'utf8', cwd: at('.') });
}

const known = JSON.parse(readFileSync(at('libs/harness/src/testing/cases/exact-05.json'), 'utf8'));

describe('npm run forecast', () => {
  let folder;
  let plan;
  beforeEach(() => {
    folder = mkdtempSync(join(tmpdir(), 'lampwright-forecast-'));
    plan = join(folder, 'plan.json');
    writeFileSync(plan, JSON.stringify(known.harness));
  });
  afterEach(() => rmSync(folder, { recursive: true, force: true }));

  it('prints one line a circuit, with the least seconds there are', () => {
    const { status, stdout, stderr } = forecast(plan);
    expect({ status, stderr }).toEqual({ status: 0, stderr: '' });
    const lines = stdout
      .trimEnd()
      .split('\n')
      .map((line) => JSON.parse(line));
    expect(lines).toHaveLength(1);
    const { walk } = known.expected;
    expect(lines[0]).toMatchObject({
      file: plan,
      circuit: 'marker',
      sections: walk.sections,
      proven: true,
      foundRate: 1,
      confidence: { stated: 1, actual: 1 },
    });
    expect(lines[0].expectedSeconds).toBeCloseTo(walk.optimumSeconds, 1);
    expect(lines[0].lowerBoundSeconds).toBeCloseTo(walk.optimumSeconds, 1);
    expect(lines[0].worstSeconds).toBeGreaterThan(walk.optimumSeconds);
    expect(lines[0].expectedPowerUps).toBeGreaterThan(1);
    expect(lines[0].habits.easiestFirstSeconds).toBeCloseTo(walk.easiestFirstSeconds, 1);
    expect(lines[0].habits.halfByCountSeconds).toBeCloseTo(walk.halfByCountSeconds, 1);
    const { median, p95, max } = lines[0].decisionMilliseconds;
    expect(median).toBeGreaterThan(0);
    expect([median, p95, max]).toEqual([median, p95, max].sort((a, b) => a - b));
  });

  it('takes the times that are asked for', () => {
    const { stdout } = forecast(plan, '--at-hand', '--overload-seconds', '40');
    const { expectedSeconds } = JSON.parse(stdout);
    expect(expectedSeconds).toBeCloseTo(known.expected.breaker.optimumSeconds, 1);
  });

  it('plays random traces', () => {
    const random = ['--faults', '2', '--detect', '0.9', '--samples', '50', '--seed', '4'];
    const { deciles, ...line } = JSON.parse(forecast(plan, ...random, '--deciles').stdout);
    expect(line).toMatchObject({ proven: false, habits: { easiestFirstSeconds: null } });
    expect(line.confidence.stated).toBeGreaterThan(0.95);
    expect(line.foundRate).toBeGreaterThan(0.5);
    expect(deciles).toHaveLength(10);
  });

  it.each([
    { args: ['--faults', '4'], says: '--faults is "4"' },
    { args: ['--detect', '0'], says: '--detect is "0"' },
    { args: ['--power-seconds', 'ten'], says: '--power-seconds is "ten"' },
    { args: ['--samples', '1.5'], says: '--samples is "1.5"' },
    { args: ['--sample', '10'], says: "Unknown option '--sample'" },
    { args: ['--at-hand', '--walk-seconds-per-metre', '1'], says: 'exclude each other' },
    { args: ['--circuit', 'beacon'], says: 'has no circuit "beacon"' },
    { args: ['nowhere.json'], says: 'nowhere.json cannot be read' },
    { args: ['package.json'], says: 'package.json is no plan' },
  ])('says what is wrong with $args and prints nothing', ({ args, says }) => {
    const { status, stdout, stderr } = forecast(plan, ...args);
    expect(stderr).toContain(says);
    expect(stderr).not.toMatch(/\n\s+at /);
    expect({ status, stdout }).toEqual({ status: 1, stdout: '' });
  });

  it('wants a plan', () => {
    const { status, stderr } = forecast();
    expect(status).toBe(1);
    expect(stderr).toContain('no plan was named');
  });
});
