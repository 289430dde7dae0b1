import { contrast } from './contrast';
import { palette, type PaletteName } from './palette';

const grounds: PaletteName[] = ['bg.canvas', 'bg.panel', 'bg.sunken'];
const on = (front: PaletteName, backs: PaletteName[]) =>
  backs.map((back): [PaletteName, PaletteName] => [front, back]);

const text = [
  ...on('fg', [...grounds, 'amber.wash', 'slate.wash', 'ember.wash', 'pine.wash']),
  ...on('fg.muted', grounds),
  ...on('amber.fg', ['bg.canvas', 'bg.panel', 'amber.wash']),
  ...on('slate.fg', ['bg.canvas', 'bg.panel', 'slate.wash']),
  ...on('ember.fg', ['bg.canvas', 'bg.panel', 'ember.wash']),
  ...on('pine.fg', ['bg.canvas', 'bg.panel', 'pine.wash']),
  ...on('ink.onSolid', ['ink.solid', 'ink.pressed']),
  ...on('ember.onSolid', ['ember.solid', 'ember.pressed']),
  ...on('pine.onSolid', ['pine.solid', 'pine.pressed']),
  ...on('amber.onMark', ['amber.mark']),
];

const marks = [
  ...on('edge', ['bg.canvas', 'bg.panel', 'bg.sunken']),
  ...on('amber.edge', ['bg.canvas', 'bg.panel', 'amber.wash']),
  ...on('slate.mark', ['bg.canvas', 'bg.panel']),
  ...on('ember.mark', ['bg.canvas', 'bg.panel', 'ember.wash']),
  ...on('pine.mark', ['bg.canvas', 'bg.panel', 'pine.wash']),
  ...on('focus', grounds),
];

describe.each(['light', 'dark'] as const)('the %s theme', (theme) => {
  it.each(text)('%s on %s reads at 7:1 or more', (front, back) => {
    expect(contrast(palette[front][theme], palette[back][theme])).toBeGreaterThanOrEqual(7);
  });

  it.each(marks)('%s on %s is seen at 3:1 or more', (front, back) => {
    expect(contrast(palette[front][theme], palette[back][theme])).toBeGreaterThanOrEqual(3);
  });
});

describe('contrast', () => {
  it('is 21 for black on white and 1 for a colour on itself', () => {
    expect(contrast('#000000', '#FFFFFF')).toBeCloseTo(21, 5);
    expect(contrast('#7A8C99', '#7A8C99')).toBe(1);
  });
});
