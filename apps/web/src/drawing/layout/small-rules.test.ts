import { nearestTo } from './hit';
import { labelVariants, shortName } from './label-lines';
import { placeFlags, type FlagRequest } from './place-flags';
import { boxesOverlap } from './geometry';
import { lengthParts, scaleBar } from './scale-bar';
import { turnOf } from './turn-of';

describe('nearestTo', () => {
  const points = new Map([
    ['a', { x: 0, y: 0 }],
    ['b', { x: 30, y: 0 }],
  ]);

  it('gives an overlapping touch to the nearer part', () => {
    expect(nearestTo({ x: 14, y: 0 }, points, 56)).toBe('a');
    expect(nearestTo({ x: 16, y: 0 }, points, 56)).toBe('b');
  });

  it('gives a touch far from all parts to none', () => {
    expect(nearestTo({ x: 100, y: 0 }, points, 56)).toBeNull();
  });
});

describe('scaleBar', () => {
  it('is a round length no longer than asked', () => {
    expect(scaleBar(30, 'metres', 160)).toEqual({ length: 5, pixels: 150, parts: 5 });
    expect(scaleBar(30, 'feet', 160).length).toBe(10);
    expect(scaleBar(300, 'feet', 100).length).toBe(1);
  });

  it('measures a 53 ft trailer in feet and inches, and in metres', () => {
    expect(lengthParts(16.1544, 'feet')).toEqual({ feet: 53, inches: 0 });
    expect(lengthParts(4.95, 'feet')).toEqual({ feet: 16, inches: 3 });
    expect(lengthParts(16.1544, 'metres')).toEqual({ metres: 16.15 });
  });
});

describe('labelVariants', () => {
  it('drops the side, breaks in two, then falls back on the code', () => {
    expect(labelVariants('P3 rear light bar plug', 4)).toEqual([
      ['P3 rear light bar plug'],
      ['P3 rear light', 'bar plug'],
      ['P3'],
    ]);
    expect(labelVariants('Tail, stop and turn, curb side', 12)).toEqual([
      ['Tail, stop and turn'],
      ['Tail, stop', 'and turn'],
      ['12'],
    ]);
  });

  it('does not take a capital word for a code', () => {
    expect(shortName('ABS lamp')).toBeNull();
    expect(shortName('RU2 upper deck rail plug')).toBe('RU2');
  });
});

describe('turnOf', () => {
  it('faces the feed side to the wire that comes in, whatever small jog it ends in', () => {
    const from = { x: 0, y: 0 };
    expect(turnOf([from, { x: 50, y: 0 }], 20)).toBe(0);
    expect(turnOf([from, { x: -50, y: 0 }], 20)).toBe(180);
    expect(turnOf([from, { x: 0, y: 50 }], 20)).toBe(90);
    expect(turnOf([from, { x: 50, y: 0 }, { x: 50, y: 5 }], 20)).toBe(0);
  });
});

describe('placeFlags', () => {
  const flag = (id: string, x: number): FlagRequest => ({
    id,
    at: { x, y: 100 },
    edge: 'top',
    variants: [`Part it here: ${id}`, id],
  });
  const row = { y: 6, height: 30, left: 0, right: 400 };

  it('puts a flag over its part and keeps it on the sheet', () => {
    const [middle] = placeFlags([flag('P3', 200)], 'top', row, 16);
    expect(middle!.box.x + middle!.box.width / 2).toBeCloseTo(200);
    const [edge] = placeFlags([flag('P9', 399)], 'top', row, 16);
    expect(edge!.box.x + edge!.box.width).toBeLessThanOrEqual(400 + 1e-6);
  });

  it('writes shorter rather than overlap, and leaves out what cannot fit', () => {
    const many = placeFlags(
      [100, 110, 120, 130].map((x) => flag(`P${x}`, x)),
      'top',
      row,
      16,
    );
    expect(many.map((placed) => placed.text)).toEqual(['P100', 'P110', 'P120', 'P130']);
    many.forEach((one, at) =>
      many.slice(at + 1).forEach((two) => expect(boxesOverlap(one.box, two.box)).toBe(false)),
    );
    const crowd = Array.from({ length: 40 }, (_, at) => flag(`P${at}`, at * 10));
    const placed = placeFlags(crowd, 'top', row, 16);
    expect(placed.length).toBeGreaterThan(3);
    expect(placed.length).toBeLessThan(40);
    expect(placed.every(({ box }) => box.x >= -1e-6 && box.x + box.width <= 400 + 1e-6)).toBe(true);
  });
});
