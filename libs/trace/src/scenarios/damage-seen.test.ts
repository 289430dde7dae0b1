import { placeKey } from '@lampwright/harness';
import { situation } from '../situation';
import { Teller } from '../testing';

it('damage makes a place likelier, and noting it changes no reading', () => {
  const trace = new Teller().narrows();
  const place = { kind: 'part', id: 'l2' } as const;
  const chance = () =>
    situation(trace.context)!.placesInQuestion.find(({ ref }) => placeKey(ref) === 'part:l2')!
      .probability;
  const before = chance();
  trace.says({ type: 'damage.seen', place, note: 'Lens cracked' });
  // Four times the odds of before.
  expect(chance() / (1 - chance())).toBeCloseTo((4 * before) / (1 - before), 9);
  expect(trace.context.damage).toEqual([{ place, note: 'Lens cracked' }]);
});
