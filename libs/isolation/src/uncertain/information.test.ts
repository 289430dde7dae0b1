import { binaryEntropy, expectedBits, mostBits } from './information';

// Recomputed outside this library; the capacity is the published one of a Z-channel.
describe.each([
  { detection: 0.9, half: 0.75828, most: 0.76285, best: 0.456 },
  { detection: 0.8, half: undefined, most: 0.61823, best: 0.436 },
  { detection: 0.7, half: 0.49342, most: 0.50369, best: 0.421 },
  { detection: 0.5, half: 0.31128, most: 0.32193, best: 0.4 },
])(
  'a power-up that shows a short with probability $detection',
  ({ detection, half, most, best }) => {
    it('tells the known number of bits', () => {
      if (half !== undefined) expect(expectedBits(0.5, detection)).toBeCloseTo(half, 5);
      expect(mostBits(detection)).toBeCloseTo(most, 5);
    });

    it('tells the most with a little less than half energised', () => {
      const shares = Array.from({ length: 999 }, (_, at) => (at + 1) / 1000);
      const bits = shares.map((share) => expectedBits(share, detection));
      expect(shares[bits.indexOf(Math.max(...bits))]).toBeCloseTo(best, 2);
      expect(Math.max(...bits)).toBeLessThanOrEqual(mostBits(detection) + 1e-12);
    });
  },
);

describe('a power-up that always shows a short', () => {
  it('tells the entropy of its outcome', () => {
    expect(expectedBits(0.3, 1)).toBe(binaryEntropy(0.3));
    expect(mostBits(1)).toBe(1);
  });

  it('tells nothing where the outcome is known', () => {
    expect([expectedBits(0, 1), expectedBits(1, 1), expectedBits(1, 0.7)]).toEqual([0, 0, 0]);
  });
});
