import fc from 'fast-check';
import { spaceOut } from './space-out';

const targets = fc
  .array(fc.double({ min: -50, max: 450, noNaN: true }), { minLength: 1, maxLength: 30 })
  .map((values) => [...values].sort((a, b) => a - b));

describe('spaceOut', () => {
  it('leaves alone what is far enough apart', () => {
    expect(spaceOut([10, 30, 60], 20, 0, 100)).toEqual([10, 30, 60]);
  });

  it('moves two that coincide apart by the same distance', () => {
    expect(spaceOut([50, 50], 20, 0, 100)).toEqual([40, 60]);
  });

  it('keeps the gap that follows each value', () => {
    expect(spaceOut([0, 0, 0], [10, 30], 0, 100)).toEqual([0, 10, 40]);
  });

  it('spreads over the whole line what cannot fit', () => {
    expect(spaceOut([5, 5, 5, 5], 100, 0, 40)).toEqual([5, 15, 25, 35]);
  });

  it('keeps order, gap and bounds', () => {
    fc.assert(
      fc.property(targets, fc.integer({ min: 1, max: 13 }), (values, gap) => {
        const spaced = spaceOut(values, gap, 0, 400);
        expect(spaced).toHaveLength(values.length);
        spaced.forEach((value, at) => {
          expect(value).toBeGreaterThanOrEqual(-1e-6);
          expect(value).toBeLessThanOrEqual(400 + 1e-6);
          if (at > 0) expect(value - spaced[at - 1]!).toBeGreaterThanOrEqual(gap - 1e-6);
        });
      }),
    );
  });

  it('moves no further than any other arrangement, in the sum of squares', () => {
    const cost = (values: number[], of: number[]) =>
      of.reduce((sum, value, at) => sum + (value - values[at]!) ** 2, 0);
    fc.assert(
      fc.property(targets, targets, fc.integer({ min: 1, max: 13 }), (values, other, gap) => {
        const spaced = spaceOut(values, gap, 0, 400);
        const rival = spaceOut(
          values.map((_, at) => other[at % other.length]!).sort((a, b) => a - b),
          gap,
          0,
          400,
        );
        expect(cost(values, spaced)).toBeLessThanOrEqual(cost(values, rival) + 1e-3);
      }),
    );
  });
});
