import { reweigh } from './reweigh';

describe('reweigh', () => {
  it('is Bayes’ rule', () => {
    const after = reweigh([0.5, 0.25, 0.25, 0], [0.1, 0.4, 0, 1]);
    expect(after[0]).toBeCloseTo(1 / 3, 12);
    expect(after[1]).toBeCloseTo(2 / 3, 12);
    expect(after.slice(2)).toEqual([0, 0]);
  });

  it('keeps the belief where the evidence denies all of it', () => {
    expect(reweigh([0.5, 0.5, 0], [0, 0, 1])).toEqual([0.5, 0.5, 0]);
  });
});
