import fc from 'fast-check';
import { sectionTree } from '@lampwright/harness';
import { exactCases } from '@lampwright/harness/testing';
import { firstQuestion } from '../forecast';
import { plan } from '../planner';
import { arbitraryQuestion } from '../testing/arbitraryQuestion';
import { bruteForceSeconds } from '../testing/bruteForce';
import { settings } from '../testing/settings';

// Source of the figures: the case files of the plan format, by an exhaustive search outside this library.
describe.each(exactCases)('the exact search on $name', ({ harness, circuit, expected }) => {
  const tree = sectionTree(harness, circuit);

  it.each(settings)('finds the optimum, $name', ({ name, timing }) => {
    const next = plan(firstQuestion(tree, timing));
    expect(next).toMatchObject({ kind: 'powerUp', advice: { proof: 'optimal' } });
    if (next.kind !== 'powerUp') return;
    expect(next.advice.expectedSeconds).toBeCloseTo(expected[name].optimumSeconds ?? NaN, 2);
  });
});

describe('the exact search', () => {
  it('agrees with trying everything, whatever is open and whatever is in question', () => {
    fc.assert(
      fc.property(arbitraryQuestion({ points: 5 }), (question) => {
        const next = plan(question);
        if (next.kind !== 'powerUp') throw new Error('several sections are in question');
        expect(next.advice.proof).toBe('optimal');
        expect(next.advice.expectedSeconds).toBeCloseTo(bruteForceSeconds(question), 6);
      }),
      { numRuns: 80 },
    );
  }, 30_000);
});
