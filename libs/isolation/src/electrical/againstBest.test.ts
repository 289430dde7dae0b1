import { againstBest } from './againstBest';

describe('againstBest', () => {
  it('keeps a little for what the reading denies', () => {
    const [best, half, none] = againstBest([0.04, 0.02, 0], 0.01);
    expect(best).toBe(1);
    expect(half).toBeCloseTo(0.505, 12);
    expect(none).toBe(0.01);
  });

  it('says nothing where the reading fits nothing', () => {
    expect(againstBest([0, 0], 0.01)).toEqual([1, 1]);
  });
});
