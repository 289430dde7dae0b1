import fc from 'fast-check';
import { parsePlaceKey, placeKey } from './placeKey';
import type { PlaceRef } from './sections';

describe('placeKey', () => {
  it('reads as a person would write it', () => {
    expect(placeKey({ kind: 'run', id: 'w1' })).toBe('run:w1');
    expect(placeKey({ kind: 'part', id: 'p3' })).toBe('part:p3');
    expect(placeKey({ kind: 'part', id: 'p3', half: 'feed' })).toBe('part:p3:feed');
  });

  it('keeps apart a half, and an id that looks like one', () => {
    expect(placeKey({ kind: 'part', id: 'p3:feed' })).toBe('part:p3%3Afeed');
  });

  it('is undone by parsePlaceKey for any id', () => {
    const id = fc.oneof(
      fc.string(),
      fc.string({ unit: fc.constantFrom(':', '%', '2', '5', 'feed', '\n', '\ud800') }),
    );
    const ref: fc.Arbitrary<PlaceRef> = fc.oneof(
      fc.record({ kind: fc.constant('run' as const), id }),
      fc.record({ kind: fc.constant('part' as const), id }),
      fc.record({
        kind: fc.constant('part' as const),
        id,
        half: fc.constantFrom('feed' as const, 'load' as const),
      }),
    );
    fc.assert(
      fc.property(ref, (place) => {
        expect(parsePlaceKey(placeKey(place))).toEqual(place);
      }),
    );
  });

  it.each(['', 'p3', 'wire:w1', 'run:w1:feed', 'part:p3:left', 'part:p3:feed:load', 'part:100%'])(
    'knows that %j is no key',
    (key) => expect(parsePlaceKey(key)).toBeNull(),
  );
});
