import fc from 'fast-check';
import { energisedSections } from '@lampwright/harness';
import { arbitraryQuestion } from '../testing/arbitraryQuestion';
import { pointId } from '../testing/trees';
import { DEFAULT_TIMING } from '../timing';
import type { Hunt } from '../types';
import { beliefIn } from './beliefIn';

/**
 * The same by listing every set of shorts with the mended ones among them, and multiplying its prior with the
 * probability of each reading at its time. Before a repair the mended short was there, afterwards it was not.
 */
function listed({ tree, readings, options, mended = [], lookedOver = [] }: Hunt) {
  const { detection = 1, maxFaults = 1 } = options;
  const prior = tree.sections.map(({ probability }) => probability);
  const lit = readings.map(({ open }) => energisedSections(tree, open));
  const weights = prior.map(() => 0);
  let none = 0;
  let total = 0;
  for (let mask = 1; mask < 2 ** prior.length; mask += 1) {
    const set = [...prior.keys()].filter((at) => (mask >> at) & 1);
    if (set.length > maxFaults || set.some((at) => lookedOver.includes(at))) continue;
    if (!mended.every(({ section }) => set.includes(section))) continue;
    let weight = set.reduce((product, at) => product * (prior[at] ?? 0), 0.2 ** (set.length - 1));
    readings.forEach(({ outcome }, index) => {
      const gone = mended.filter(({ after }) => index >= after).map(({ section }) => section);
      const shows = set.some((at) => lit[index]?.[at] && !gone.includes(at)) ? detection : 0;
      weight *= outcome === 'overload' ? shows : 1 - shows;
    });
    total += weight;
    const left = set.filter((at) => !mended.some(({ section }) => section === at));
    if (left.length === 0) none += weight;
    for (const at of left) weights[at] = (weights[at] ?? 0) + weight;
  }
  return { total, none: none / total, each: weights.map((weight) => weight / (total - none)) };
}

describe('what is known in a hunt', () => {
  const draft = fc.record({
    parted: fc.array(fc.integer({ min: 1, max: 5 }), { maxLength: 3 }),
    outcome: fc.constantFrom('overload' as const, 'holds' as const),
  });

  it('agrees with listing every set of shorts, with repairs at their time', () => {
    let compared = 0;
    fc.assert(
      fc.property(
        arbitraryQuestion({ points: 5 }),
        fc.array(draft, { maxLength: 6 }),
        fc.record({
          first: fc.nat(),
          second: fc.nat(),
          at: fc.nat({ max: 6 }),
          then: fc.nat({ max: 6 }),
        }),
        fc.constantFrom(1, 2),
        fc.constantFrom(1, 0.9, 0.7),
        ({ tree }, drafts, { first, second, at, then }, repairs, detection) => {
          const readings = drafts.map(({ parted, outcome }) => ({
            open: parted.map(pointId),
            outcome,
          }));
          const able = tree.sections.filter(({ probability }) => probability > 0);
          const one = able[first % able.length]?.index ?? 0;
          const two = able[second % able.length]?.index ?? 0;
          fc.pre(one !== two);
          const three = able[(first + second) % able.length]?.index ?? 0;
          const mended = [
            { section: one, after: Math.min(at, readings.length) },
            { section: two, after: Math.min(at + then, readings.length) },
          ].slice(0, repairs);
          const hunt: Hunt = {
            tree,
            readings,
            options: { detection, maxFaults: 3 },
            open: [],
            timing: DEFAULT_TIMING,
            mended,
            lookedOver: three === one || three === two ? [] : [three],
          };
          const expected = listed(hunt);
          fc.pre(expected.total > 0);
          const { noneLeft, belief } = beliefIn(hunt);
          expect(noneLeft).toBeCloseTo(expected.none, 9);
          if (expected.none > 1 - 1e-9) return;
          compared += 1;
          belief.probabilities.forEach((probability, section) => {
            expect(probability).toBeCloseTo(expected.each[section] ?? NaN, 9);
          });
        },
      ),
      { numRuns: 200 },
    );
    expect(compared).toBeGreaterThan(50);
  });
});
