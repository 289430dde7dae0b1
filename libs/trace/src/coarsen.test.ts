import { sectionTree } from '@lampwright/harness';
import { believe } from '@lampwright/isolation';
import fc from 'fast-check';
import { coarsen } from './coarsen';
import { lineHarness } from './testing';

const points = ['p1', 'p2', 'p3', 'l1', 'l2', 'l3'];
const fine = sectionTree(lineHarness, 'tail');

it('a belief told over fewer points is the belief formed with fewer points, where no reading used them', () => {
  fc.assert(
    fc.property(fc.subarray(points), fc.subarray(points), (barred, open) => {
      const coarse = sectionTree(lineHarness, 'tail', { notSeparable: new Set(barred) });
      const reading = {
        open: open.filter((point) => !barred.includes(point)),
        outcome: 'overload' as const,
      };
      const told = coarsen(believe(fine, [reading]), fine, coarse);
      const formed = believe(coarse, [reading]);
      told.probabilities.forEach((probability, index) => {
        expect(probability).toBeCloseTo(formed.probabilities[index]!, 12);
      });
      expect(new Set(told.inQuestion)).toEqual(new Set(formed.inQuestion));
    }),
  );
});
