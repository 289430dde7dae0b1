import { createTapGuard } from './tap-guard';

describe('a glove that bounces', () => {
  it('answers once', () => {
    const guard = createTapGuard(400);
    expect(guard.allows({ x: 900, y: 600, at: 1_000 })).toBe(true);
    expect(guard.allows({ x: 910, y: 590, at: 1_150 })).toBe(false);
    expect(guard.allows({ x: 900, y: 600, at: 1_500 })).toBe(true);
  });

  it('does not swallow a quick tap on another card', () => {
    const guard = createTapGuard(400);
    expect(guard.allows({ x: 900, y: 300, at: 1_000 })).toBe(true);
    expect(guard.allows({ x: 900, y: 390, at: 1_120 })).toBe(true);
  });
});
