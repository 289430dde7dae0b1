import fc from 'fast-check';
import { energisedSections } from '@lampwright/harness';
import { believe } from './belief';
import { arbitraryQuestion } from './testing/arbitraryQuestion';
import { pointId, treeOf } from './testing/trees';
import type { BeliefOptions, Reading } from './types';

const chain = (length: number) => treeOf(Array.from({ length }, (_, index) => index - 1));
const star = (leaves: number) => treeOf([-1, ...Array.from({ length: leaves }, () => 0)]);
const sum = (values: readonly number[]) => values.reduce((total, value) => total + value, 0);

/** The belief by listing every set of sections and multiplying its prior with the probability of each reading. */
function listed(
  tree: ReturnType<typeof treeOf>,
  readings: readonly Reading[],
  { detection = 1, maxFaults = 1 }: BeliefOptions,
): number[] {
  const prior = tree.sections.map(({ probability }) => probability);
  const lit = readings.map(({ open }) => energisedSections(tree, open));
  const weights = prior.map(() => 0);
  let total = 0;
  for (let mask = 1; mask < 2 ** prior.length; mask += 1) {
    const set = [...prior.keys()].filter((at) => (mask >> at) & 1);
    if (set.length > maxFaults) continue;
    let weight = set.reduce((product, at) => product * (prior[at] ?? 0), 0.2 ** (set.length - 1));
    readings.forEach(({ outcome }, index) => {
      const shows = set.some((at) => lit[index]?.[at]) ? detection : 0;
      weight *= outcome === 'overload' ? shows : 1 - shows;
    });
    total += weight;
    for (const at of set) weights[at] = (weights[at] ?? 0) + weight;
  }
  return weights.map((weight) => (total > 0 ? weight / total : 0));
}

describe('believe', () => {
  it('clears what held and keeps what overloaded', () => {
    const tree = chain(4);
    expect(believe(tree, [{ open: ['p2'], outcome: 'holds' }])).toEqual({
      probabilities: [0, 0, 0.5, 0.5],
      inQuestion: [2, 3],
      contradicted: false,
    });
    expect(believe(tree, [{ open: ['p1'], outcome: 'overload' }]).inQuestion).toEqual([0]);
  });

  it('reports a contradiction', () => {
    const readings: Reading[] = [
      { open: ['p2'], outcome: 'holds' },
      { open: ['p1'], outcome: 'overload' },
    ];
    expect(believe(chain(3), readings)).toEqual({
      probabilities: [0, 0, 0],
      inQuestion: [],
      contradicted: true,
    });
  });

  it('finds two shorts where one cannot be', () => {
    // Either leaf overloads with the other unplugged, and the hub holds alone.
    const readings: Reading[] = [
      { open: ['p1', 'p2', 'p3'], outcome: 'holds' },
      { open: ['p2', 'p3'], outcome: 'overload' },
      { open: ['p1', 'p3'], outcome: 'overload' },
    ];
    expect(believe(star(3), readings).contradicted).toBe(true);
    const { probabilities, contradicted } = believe(star(3), readings, { maxFaults: 2 });
    expect(contradicted).toBe(false);
    expect(probabilities).toEqual([0, 1, 1, 0]);
  });

  it('agrees with listing every set of shorts', () => {
    const options = fc.record({
      detection: fc.constantFrom(1, 0.9, 0.5),
      maxFaults: fc.constantFrom(1, 2, 3),
    });
    const reading = fc.record({
      parted: fc.array(fc.integer({ min: 1, max: 6 }), { maxLength: 3 }),
      outcome: fc.constantFrom('overload' as const, 'holds' as const),
    });
    fc.assert(
      fc.property(
        arbitraryQuestion({ points: 6 }),
        fc.array(reading, { maxLength: 5 }),
        options,
        ({ tree }, drafts, option) => {
          const readings = drafts.map(({ parted, outcome }) => ({
            open: parted.map(pointId),
            outcome,
          }));
          const belief = believe(tree, readings, option);
          const expected = listed(tree, readings, option);
          expect(belief.contradicted).toBe(sum(expected) === 0);
          belief.probabilities.forEach((value, at) => {
            expect(value).toBeCloseTo(expected[at] ?? NaN, 9);
          });
          if (option.maxFaults === 1 && !belief.contradicted) {
            expect(sum(belief.probabilities)).toBeCloseTo(1, 9);
          }
        },
      ),
    );
  });

  it('expects about as many shorts as sections that are short independently', () => {
    // 20 sections, each short with probability 0.01, at least one of them: 1.0993 on average (recomputed).
    const { probabilities } = believe(star(19), [], { maxFaults: 3 });
    expect(sum(probabilities)).toBeCloseTo((20 * 0.01) / (1 - 0.99 ** 20), 1);
  });

  it('is as easy for a thousand sections with three shorts', () => {
    const tree = chain(1000);
    const readings: Reading[] = [
      { open: ['p500'], outcome: 'overload' },
      { open: ['p250'], outcome: 'holds' },
    ];
    const { inQuestion, probabilities } = believe(tree, readings, { maxFaults: 3 });
    expect(Math.min(...inQuestion)).toBe(250);
    expect(sum(probabilities)).toBeGreaterThan(1);
  });
});
