import { closingSeconds, powerUpSeconds } from './costs';
import { pointAt, treeOf } from './testing/trees';
import { DEFAULT_TIMING } from './timing';

// Source: the plan format, "A power-up, and what it costs".
describe('seconds', () => {
  const tree = treeOf([-1, 0, 0, 2], (at) => ({
    openSeconds: 10 * at,
    closeSeconds: at,
    along: 2 * at,
  }));
  const timing = { ...DEFAULT_TIMING, overloadSeconds: 40 };

  it('of a power-up: hands, one walk to the farthest point touched, the power, the overload', () => {
    // p3 stays open and is farther off than what is touched: p1 closed at 2 m, p2 opened at 4 m.
    expect(powerUpSeconds(tree, ['p1', 'p3'], ['p2', 'p3'], timing)).toEqual({
      holds: 15 + 1 + 20 + 8,
      overload: 15 + 1 + 20 + 8 + 40,
    });
  });

  it('of a power-up that touches nothing', () => {
    expect(powerUpSeconds(tree, ['p1'], ['p1'], timing).holds).toBe(15);
  });

  it('of walking from a switch that is not at the front', () => {
    expect(powerUpSeconds(tree, [], ['p1'], { ...timing, powerAlong: 5 }).holds).toBe(15 + 10 + 6);
  });

  it('of closing everything, points of other circuits too', () => {
    expect(closingSeconds(tree, [], timing)).toBe(0);
    expect(closingSeconds(tree, ['p1', 'p2'], timing)).toBe(3 + 8);
    const elsewhere = [{ ...pointAt(tree, 3), partId: 'x', along: 9 }];
    expect(closingSeconds(tree, ['p1', 'x'], timing, elsewhere)).toBe(1 + 3 + 18);
  });
});
