import { sectionTree, type SectionTree } from '@lampwright/harness';
import { exactCases, largeCases, type CaseExpectation } from '@lampwright/harness/testing';
import {
  createPlanner,
  DEFAULT_TIMING,
  firstQuestion,
  forecast,
  THOROUGH_STEPS,
  type Plan,
  type Planner,
  type Question,
  type Timing,
} from '@lampwright/isolation';
import { grownTree } from './trees';

export interface BenchRow {
  name: string;
  value: number;
  unit: string;
  target?: string;
}

const settings: Record<'walk' | 'hand' | 'breaker', Timing> = {
  walk: DEFAULT_TIMING,
  hand: { ...DEFAULT_TIMING, walkSecondsPerMetre: 0 },
  breaker: { ...DEFAULT_TIMING, walkSecondsPerMetre: 0, overloadSeconds: 40 },
};
const names = ['walk', 'hand', 'breaker'] as const;

/** A planner that notes how long each of its plans took, in milliseconds. */
function timed(planner: Planner): Planner & { took: number[] } {
  const took: number[] = [];
  const plan = (question: Question): Plan => {
    const from = performance.now();
    const made = planner.plan(question);
    took.push(performance.now() - from);
    return made;
  };
  return { plan, took };
}

function percentile(values: readonly number[], share: number): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.min(sorted.length - 1, Math.floor(share * sorted.length))] ?? 0;
}

/** Decisions of whole traces at 62 parts: each time a power-up is asked for, with every section as the hidden short. */
function decisionRows(): BenchRow[] {
  const at60 = largeCases.find(({ harness }) => harness.parts.length >= 60);
  if (!at60) return [];
  const tree = sectionTree(at60.harness, at60.circuit);
  return [
    { label: 'first answer', planner: timed(createPlanner()), limit: 50 },
    { label: 'final answer', planner: timed(createPlanner({ steps: THOROUGH_STEPS })), limit: 500 },
  ].flatMap(({ label, planner, limit }) => {
    for (const name of names) forecast(tree, settings[name], planner);
    const name = `decision at ${at60.harness.parts.length} parts, ${label}`;
    const target = `< ${limit}`;
    return [
      { name: `${name}, median`, value: percentile(planner.took, 0.5), unit: 'ms' },
      {
        name: `${name}, 95th percentile`,
        value: percentile(planner.took, 0.95),
        unit: 'ms',
        target,
      },
      { name: `${name}, longest`, value: Math.max(...planner.took), unit: 'ms' },
    ];
  });
}

function sizeRows(): BenchRow[] {
  const planner = timed(createPlanner());
  const row = (name: string, tree: SectionTree, target?: string): BenchRow => {
    planner.plan(firstQuestion(tree, DEFAULT_TIMING));
    const value = planner.took.at(-1) ?? 0;
    return target ? { name, value, unit: 'ms', target } : { name, value, unit: 'ms' };
  };
  return [
    row('first decision at 1,000 points, branching', grownTree(1000, 10, 7), '< 300'),
    row('first decision at 1,000 points, all on one hub', grownTree(1000, 1000, 7), '< 300'),
    row('first decision at 2,000 points, branching', grownTree(2000, 10, 7)),
    row('first decision at 5,000 points, branching', grownTree(5000, 10, 7)),
    row('first decision at 10,000 points, branching', grownTree(10_000, 10, 7), '< 2000'),
    row('first decision at 10,000 points, one chain', grownTree(10_000, 1, 7), '< 2000'),
    row('first decision at 10,000 points, all on one hub', grownTree(10_000, 10_000, 7), '< 2000'),
  ];
}

interface Excess {
  quick: number;
  thorough: number;
  easiestFirst: number[];
  halfByCount: number[];
  greedy: number;
}

/** Expected seconds over the optimum or the reference, in percent of it. */
function excessOf(
  tree: SectionTree,
  timing: Timing,
  expected: CaseExpectation,
  planners: { quick: Planner; thorough: Planner },
): Excess {
  const known = expected.optimumSeconds ?? expected.referenceSeconds ?? NaN;
  const over = (seconds: number) => 100 * (seconds / known - 1);
  const promised = (planner: Planner) => {
    const plan = planner.plan(firstQuestion(tree, timing));
    return plan.kind === 'powerUp' ? plan.advice.expectedSeconds : plan.closingSeconds;
  };
  return {
    quick: over(promised(planners.quick)),
    thorough: over(promised(planners.thorough)),
    easiestFirst: expected.easiestFirstSeconds === null ? [] : [over(expected.easiestFirstSeconds)],
    halfByCount: expected.halfByCountSeconds === null ? [] : [over(expected.halfByCountSeconds)],
    greedy: over(expected.greedySeconds),
  };
}

function excessRows(): BenchRow[] {
  const planners = { quick: createPlanner(), thorough: createPlanner({ steps: THOROUGH_STEPS }) };
  const mean = (values: number[]) => values.reduce((sum, value) => sum + value, 0) / values.length;
  return [
    { cases: exactCases, over: 'optimum, 4 to 9 sections' },
    { cases: largeCases, over: 'reference, 17 to 41 sections' },
  ].flatMap(({ cases, over }) => {
    const all = cases.flatMap(({ harness, circuit, expected }) => {
      const tree = sectionTree(harness, circuit);
      return names.map((name) => excessOf(tree, settings[name], expected[name], planners));
    });
    const mostAllowed = over.startsWith('optimum') ? '< 0.02' : '<= 0';
    const row = (what: string, values: number[], target?: string): BenchRow => ({
      name: `expected seconds over the ${over}: ${what}`,
      value: mean(values),
      unit: '%',
      ...(target ? { target } : {}),
    });
    return [
      row(
        'first answer',
        all.map(({ quick }) => quick),
      ),
      row(
        'final answer',
        all.map(({ thorough }) => thorough),
        mostAllowed,
      ),
      row(
        'one point at a time, most bits a second',
        all.map(({ greedy }) => greedy),
      ),
      row(
        'easiest first',
        all.flatMap(({ easiestFirst }) => easiestFirst),
      ),
      row(
        'half by count',
        all.flatMap(({ halfByCount }) => halfByCount),
      ),
    ];
  });
}

/** Measures the planner: how long it thinks, and how much longer its plays take than the best known ones. */
export function plannerRows(): BenchRow[] {
  const rows = [...decisionRows(), ...sizeRows(), ...excessRows()];
  // Garbage not yet collected counts too, and so does the bench itself.
  const megabytes = process.memoryUsage().heapUsed / 1e6;
  return [
    ...rows,
    { name: 'heap after all of this', value: megabytes, unit: 'MB', target: '< 200' },
  ];
}
