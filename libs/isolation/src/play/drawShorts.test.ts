import { treeOf } from '../testing/trees';
import { drawShorts, shareOfCounts } from './drawShorts';
import { seededRandom } from './seededRandom';

const tree = treeOf([-1, 0, 0, 0], (at) => ({ weight: [1, 2, 3, 0][at] }));

describe('shorts drawn at random', () => {
  it('are the same for the same seed', () => {
    const draw = (seed: number) => {
      const random = seededRandom(seed);
      return Array.from({ length: 20 }, () => drawShorts(tree, 2, random));
    };
    expect(draw(4)).toEqual(draw(4));
    expect(draw(4)).not.toEqual(draw(5));
  });

  it('come as often as the products of their probabilities say', () => {
    const random = seededRandom(1);
    const seen = new Map<string, number>();
    for (let run = 0; run < 11_000; run += 1) {
      const key = drawShorts(tree, 2, random).sort().join();
      seen.set(key, (seen.get(key) ?? 0) + 1);
    }
    // Products 2, 3 and 6 of 11; four standard deviations are about 200.
    expect([...seen.keys()].sort()).toEqual(['0,1', '0,2', '1,2']);
    expect(Math.abs((seen.get('0,1') ?? 0) - 2000)).toBeLessThan(200);
    expect(Math.abs((seen.get('0,2') ?? 0) - 3000)).toBeLessThan(200);
  });

  it('are all that can be short where more are asked for', () => {
    expect(drawShorts(tree, 4, seededRandom(1))).toEqual([0, 1, 2]);
  });

  it('are one, two or three as often as the belief weighs them', () => {
    // Sums of products of the shares 1/6, 2/6 and 3/6: 1, 11/36 and 6/216; each further short 0.2.
    const weights = [1, (0.2 * 11) / 36, (0.04 * 6) / 216];
    const total = weights.reduce((sum, weight) => sum + weight, 0);
    shareOfCounts(tree, 3).forEach((share, at) => {
      expect(share).toBeCloseTo((weights[at] ?? 0) / total, 12);
    });
  });
});
