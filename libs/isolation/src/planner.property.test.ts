import fc from 'fast-check';
import { sectionTree, type SectionTree } from '@lampwright/harness';
import { arbitraryHarness, largeCases } from '@lampwright/harness/testing';
import { adviceFor } from './adviceFor';
import { explain } from './explain';
import { firstQuestion, forecast } from './forecast';
import { easiestFirstSeconds, halfByCountSeconds } from './habits';
import { createPlanner, plan, THOROUGH_STEPS } from './planner';
import { arbitraryQuestion } from './testing/arbitraryQuestion';
import { settings } from './testing/settings';
import { DEFAULT_TIMING } from './timing';
import type { Advice, Question } from './types';

function adviceOn(question: Question): Advice {
  const next = plan(question);
  if (next.kind !== 'powerUp') throw new Error('several sections are in question');
  return next.advice;
}

/** The tree with its sections in another order, parents still first, and probabilities to match. */
function relabelled({ tree, probabilities, ...rest }: Question): Question {
  const order: number[] = [];
  const ahead = [0];
  // The last child first, where the original tells the first child first.
  for (let next = ahead.pop(); next !== undefined; next = ahead.pop()) {
    order.push(next);
    ahead.push(...(tree.sections[next]?.children ?? []));
  }
  const sections = order.map((old, index) => {
    const section = tree.sections[old];
    if (!section) throw new Error('no such section');
    const parent = section.parent === null ? null : order.indexOf(section.parent);
    const children = section.children.map((child) => order.indexOf(child));
    return { ...section, index, parent, children };
  });
  return {
    ...rest,
    tree: { ...tree, sections },
    probabilities: order.map((old) => probabilities[old] ?? 0),
  };
}

/** The tree with one more point right behind each point, nothing between the two. */
function doubled(tree: SectionTree, along: number): SectionTree {
  const sections = structuredClone(tree.sections);
  for (const section of tree.sections) {
    if (!section.point || section.parent === null) continue;
    const own = sections[section.index];
    if (!own) continue;
    // The new section is fed by a twin of the point; it must come before what it feeds, so the two swap roles.
    const index = sections.length;
    const point = { ...section.point, partId: `${section.point.partId}-twin`, along };
    sections.push({ ...own, index, parent: section.index, point, children: [...own.children] });
    for (const child of own.children) {
      const moved = sections[child];
      if (moved) moved.parent = index;
    }
    own.children = [index];
    own.weight = 0;
    own.probability = 0;
    return { ...tree, sections: parentsFirst(sections) };
  }
  return { ...tree, sections };
}

function parentsFirst(sections: SectionTree['sections']): SectionTree['sections'] {
  const order: number[] = [];
  const ahead = [0];
  for (let next = ahead.pop(); next !== undefined; next = ahead.pop()) {
    order.push(next);
    ahead.push(...(sections[next]?.children ?? []));
  }
  return order.flatMap((old, index) => {
    const section = sections[old];
    if (!section) return [];
    const parent = section.parent === null ? null : order.indexOf(section.parent);
    return [{ ...section, index, parent, children: section.children.map((c) => order.indexOf(c)) }];
  });
}

describe('an advice', () => {
  it('splits what is in question, within its bounds, at the seconds that the time model gives', () => {
    fc.assert(
      fc.property(arbitraryQuestion({ points: 9 }), (question) => {
        const advice = adviceOn(question);
        const lit = advice.energised.reduce(
          (sum, at) => sum + (question.probabilities[at] ?? 0),
          0,
        );
        expect(lit).toBeCloseTo(advice.overloadProbability, 9);
        expect(lit).toBeGreaterThan(0);
        expect(lit).toBeLessThan(1);
        expect(advice.lowerBoundSeconds).toBeLessThanOrEqual(advice.expectedSeconds + 1e-9);
        expect(advice.expectedSeconds).toBeLessThanOrEqual(advice.worstSeconds + 1e-9);
        const better = Math.min(easiestFirstSeconds(question), halfByCountSeconds(question));
        expect(advice.expectedSeconds).toBeLessThanOrEqual(better + 1e-6);
        // Behind the same pick the same play: what the person would get is what was promised.
        const picked = adviceFor(question, advice.open);
        expect(picked.expectedSeconds).toBeCloseTo(advice.expectedSeconds, 6);
        expect(picked.seconds).toEqual(advice.seconds);
      }),
      { numRuns: 40 },
    );
  }, 30_000);

  it('takes as long when the sections are told in another order', () => {
    fc.assert(
      fc.property(arbitraryQuestion({ points: 8 }), (question) => {
        const other = adviceOn(relabelled(question));
        expect(other.expectedSeconds).toBeCloseTo(adviceOn(question).expectedSeconds, 6);
      }),
      { numRuns: 40 },
    );
  }, 30_000);

  it('never takes longer for one more point that parts the same sections', () => {
    fc.assert(
      fc.property(
        arbitraryQuestion({ points: 6, opened: false }),
        fc.integer({ min: 0, max: 12 }),
        ({ tree, timing }, along) => {
          const few = firstQuestion(tree, timing);
          const many = firstQuestion(doubled(tree, along), timing);
          const seconds = adviceOn(few).expectedSeconds;
          expect(adviceOn(many).expectedSeconds).toBeLessThanOrEqual(seconds + 1e-6);
        },
      ),
      { numRuns: 40 },
    );
  }, 30_000);

  it('does not repeat the last power-up while another one tells something', () => {
    const { harness, circuit } = largeCases[0] ?? {};
    if (!harness || !circuit) throw new Error('no case');
    const question = firstQuestion(sectionTree(harness, circuit), DEFAULT_TIMING);
    const first = adviceOn(question);
    // A short that comes and goes leaves everything in question, however the reading went.
    const again = adviceOn({ ...question, open: first.open });
    expect(again.energised).not.toEqual(first.energised);
  });
});

describe('any valid plan', () => {
  it('is planned, forecast and explained', () => {
    fc.assert(
      fc.property(arbitraryHarness(), (harness) => {
        for (const { id } of harness.circuits) {
          const tree = sectionTree(harness, id);
          const question = firstQuestion(tree, DEFAULT_TIMING);
          const next = plan(question);
          const facts = explain(question, next);
          expect(facts.kind).toBe(next.kind);
          const { expectedSeconds, worstSeconds } = forecast(tree, DEFAULT_TIMING, { plan });
          expect(worstSeconds).toBeGreaterThanOrEqual(expectedSeconds - 1e-6);
          if (next.kind === 'powerUp') {
            expect(expectedSeconds).toBeLessThanOrEqual(next.advice.expectedSeconds + 1e-6);
          }
        }
      }),
      { numRuns: 25 },
    );
  }, 60_000);
});

// Source of the reference: the case files of the plan format, a strong strategy that is not proven best.
describe('plans of the size of a trailer', () => {
  const planner = createPlanner({ steps: THOROUGH_STEPS });

  it('take no longer than the reference on average, and never longer than the better habit', () => {
    const ratios = largeCases.flatMap(({ harness, circuit, expected }) =>
      settings.map(({ name, timing }) => {
        const question = firstQuestion(sectionTree(harness, circuit), timing);
        const next = planner.plan(question);
        if (next.kind !== 'powerUp') throw new Error('several sections are in question');
        const better = Math.min(easiestFirstSeconds(question), halfByCountSeconds(question));
        expect(next.advice.expectedSeconds).toBeLessThanOrEqual(better);
        return next.advice.expectedSeconds / (expected[name].referenceSeconds ?? NaN);
      }),
    );
    const average = ratios.reduce((sum, ratio) => sum + ratio, 0) / ratios.length;
    expect(average).toBeLessThanOrEqual(1);
  }, 60_000);
});
