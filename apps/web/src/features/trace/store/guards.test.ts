import { isFlag, isNumber, isText, listOf, oneOf, orNull, readAs, shapeOf } from './guards';

const read = readAs(
  shapeOf<{ name: string | null; kind: 'a' | 'b'; parts: { count: number }[]; done: boolean }>({
    name: orNull(isText),
    kind: oneOf('a', 'b'),
    parts: listOf(shapeOf<{ count: number }>({ count: isNumber })),
    done: isFlag,
  }),
);
const kept = { name: null, kind: 'b', parts: [{ count: 2 }], done: false };

describe('what was kept', () => {
  it('is read where every field fits', () => {
    expect(read(kept)).toEqual(kept);
    expect(read({ ...kept, name: 'R. Vance', kind: 'a', parts: [] })).not.toBeNull();
  });

  it.each([
    ['nothing at all', undefined],
    ['null', null],
    ['a text', 'name'],
    ['a field too few', { name: null, kind: 'b', parts: [] }],
    ['a choice that there is not', { ...kept, kind: 'c' }],
    ['a wrong field inside of a list', { ...kept, parts: [{ count: 2 }, { count: '2' }] }],
    ['an object in place of a list', { ...kept, parts: { count: 2 } }],
    ['null where there is always something', { ...kept, done: null }],
  ])('is left where it is %s', (_what, value) => {
    expect(read(value)).toBeNull();
  });
});
