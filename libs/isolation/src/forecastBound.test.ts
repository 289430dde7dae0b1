import { huntBoundSeconds } from './forecastBound';
import { treeOf } from './testing/trees';
import { DEFAULT_TIMING } from './timing';

const timing = { ...DEFAULT_TIMING, powerSeconds: 1 };
const star = (leaves: number) => treeOf([-1, ...Array.from({ length: leaves }, () => 0)]);

describe('the bound on power-ups', () => {
  it.each([
    // log2 C(n, d), recomputed: 6.644, 12.273 and 17.303 bits.
    { sections: 100, faults: 1, bits: 6.644 },
    { sections: 100, faults: 2, bits: 12.273 },
    { sections: 100, faults: 3, bits: 17.303 },
  ])('is log2 of the number of sets for $faults of $sections', ({ sections, faults, bits }) => {
    const bound = huntBoundSeconds(star(sections - 1), timing, { faults, detection: 1 });
    expect(bound).toBeCloseTo(bits, 3);
  });

  it('is the entropy of the set where sections are not equally likely', () => {
    // Sets of two of 1, 2, 3: products 2, 3 and 6.
    const shares = [2 / 11, 3 / 11, 6 / 11];
    const entropy = -shares.reduce((sum, share) => sum + share * Math.log2(share), 0);
    const tree = treeOf([-1, 0, 0], (at) => ({ weight: at + 1 }));
    expect(huntBoundSeconds(tree, timing, { faults: 2, detection: 1 })).toBeCloseTo(entropy, 9);
  });

  it.each([
    // 16 equal sections, error at most 5 %: 4.61, 6.99 and 10.93 power-ups (recomputed).
    { detection: 0.9, powerUps: 4.61 },
    { detection: 0.7, powerUps: 6.99 },
    { detection: 0.5, powerUps: 10.93 },
  ])('is $powerUps where $detection of the shorts show', ({ detection, powerUps }) => {
    expect(huntBoundSeconds(star(15), timing, { faults: 1, detection })).toBeCloseTo(powerUps, 1);
  });

  it('is the power-up that proves the repair where several shorts may be missed', () => {
    expect(huntBoundSeconds(star(15), timing, { faults: 2, detection: 0.7 })).toBe(1);
  });
});
