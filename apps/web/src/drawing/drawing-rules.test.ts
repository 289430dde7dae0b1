import { placeKey, type Part, type Run } from '@lampwright/harness';
import { chain, CIRCUIT, star } from '@lampwright/harness/testing';
import { barSlices } from './bar-slices';
import { connectedParts } from './connected-parts';
import { cutsOf } from './cuts';
import { shownHarness } from './layout/shown-circuit';
import { partTree, type PartNode } from './part-tree';
import { partMarks } from './place-marks';
import { sheetTexts } from './sheet-texts';

const plug = (id: string): Part => ({
  id,
  kind: 'plug',
  label: id,
  at: { along: 1, across: 0 },
  separable: { openSeconds: 10, closeSeconds: 5 },
});
const lamp = (id: string): Part => ({
  id,
  kind: 'lamp',
  label: id,
  at: { along: 2, across: 1 },
  lamp: { loads: [{ circuit: 'c', amps: 1 }], technology: 'led' },
});
const run = (from: string, to: string): Run => ({
  id: `${from}-${to}`,
  from,
  to,
  circuits: ['c'],
  metres: 1,
});
const inlet: Part = { id: 'inlet', kind: 'inlet', label: 'Inlet', at: { along: 0, across: 0 } };

describe('connectedParts', () => {
  const parts = [inlet, plug('p'), lamp('a'), lamp('b')];
  const runs = [run('inlet', 'p'), run('p', 'a'), run('a', 'b')];

  it('cuts off what follows an open plug, not the wire that leads to it', () => {
    const { parts: live, runs: liveRuns } = connectedParts(parts, runs, ['p']);
    expect([...live]).toEqual(['inlet', 'p']);
    expect([...liveRuns]).toEqual(['inlet-p']);
  });

  it('takes an open lamp away alone', () => {
    expect([...connectedParts(parts, runs, ['a']).runs]).toEqual(runs.map(({ id }) => id));
  });
});

describe('partMarks', () => {
  it('knows the halves of a plug, and says the heavier of the two for the whole', () => {
    const places = new Map([
      [placeKey({ kind: 'part', id: 'p', half: 'feed' }), 'cleared' as const],
      [placeKey({ kind: 'part', id: 'p', half: 'load' }), 'inQuestion' as const],
    ]);
    expect(partMarks(plug('p'), places)).toEqual({
      feed: 'cleared',
      load: 'inQuestion',
      whole: 'inQuestion',
    });
    expect(partMarks(plug('q'), places).whole).toBe('idle');
  });
});

describe('cutsOf', () => {
  const base = {
    deck: { x: 0, y: 100, width: 600, height: 200 },
    symbol: 20,
    below: true,
    wording: (part: Part) => [part.label],
  };
  const screen = new Map([
    ['p', { x: 300, y: 200 }],
    ['a', { x: 500, y: 120 }],
    ['b', { x: 500, y: 280 }],
  ]);
  const parts = [plug('p'), plug('b'), lamp('a')];

  it('goes across the whole trailer for one plug in a wire along it', () => {
    const [cut] = cutsOf({ ...base, parts, cut: ['p'], screen, turn: () => 0 });
    expect(cut!.stroke[0]).toMatchObject({ x: 300 });
    expect(cut!.stroke[0].y).toBeLessThan(100);
    expect(cut!.stroke[1]).toMatchObject({ x: 300 });
    expect(cut!.stroke[1].y).toBeGreaterThan(300);
  });

  it('is short and level across a wire that runs up or down', () => {
    const [cut] = cutsOf({ ...base, parts, cut: ['p'], screen, turn: () => 90 });
    expect(cut!.stroke[0].y).toBe(200);
    expect(cut!.stroke[1].y).toBe(200);
  });

  it('has its line come down on the side where no other part is in its way', () => {
    const cutBeside = (x: number) => {
      const beside = new Map([...screen, ['b', { x, y: 200 }] as const]);
      return cutsOf({ ...base, parts, cut: ['p'], screen: beside, turn: () => 90 })[0]!;
    };
    expect(cutBeside(270).leader.at(-1)!.x).toBeGreaterThan(300);
    expect(cutBeside(330).leader.at(-1)!.x).toBeLessThan(300);
  });

  it('is short where another part is in line with it', () => {
    const [cut] = cutsOf({ ...base, parts, cut: ['b'], screen, turn: () => 0 });
    expect(Math.abs(cut!.stroke[0].y - cut!.stroke[1].y)).toBeLessThan(80);
    expect(cut!.edge).toBe('bottom');
  });

  it('is short for each of several points', () => {
    const cuts = cutsOf({ ...base, parts, cut: ['p', 'a'], screen, turn: () => 0 });
    expect(cuts.map((cut) => cut.id)).toEqual(['p', 'a']);
    for (const { stroke } of cuts) {
      expect(Math.abs(stroke[0].y - stroke[1].y)).toBeLessThan(80);
    }
  });
});

describe('barSlices', () => {
  it('lays the cleared slices first, each as wide as its share', () => {
    const laid = barSlices([
      { key: 'a', label: 'A', probability: 0.25, state: 'inQuestion' },
      { key: 'b', label: 'B', probability: 0.75, state: 'cleared' },
    ]);
    expect(laid.map(({ key, start, share }) => [key, start, share])).toEqual([
      ['b', 0, 0.75],
      ['a', 0.75, 0.25],
    ]);
  });

  it('still fills the bar when nothing has a probability', () => {
    const laid = barSlices(
      ['a', 'b'].map((key) => ({ key, label: key, probability: 0, state: 'cleared' as const })),
    );
    expect(laid.map(({ share }) => share)).toEqual([0.5, 0.5]);
  });
});

describe('partTree', () => {
  const count = (nodes: PartNode[]): number =>
    nodes.reduce((sum, node) => sum + 1 + count(node.children), 0);

  it('hangs every part on the one that feeds it', () => {
    for (const plan of [chain(6), star(6)]) {
      const [root, ...others] = partTree(shownHarness(plan, CIRCUIT, new Set()));
      expect(others).toEqual([]);
      expect(root!.part.kind).toBe('inlet');
      expect(count([root!])).toBe(plan.parts.length);
    }
  });
});

describe('sheetTexts', () => {
  const frame = {
    deck: { x: 40, y: 100, width: 500, height: 200 },
    front: null,
    rear: null,
    alongScale: 30,
    acrossScale: 70,
  };
  const words = {
    front: 'Front',
    rear: 'Rear',
    curbSide: 'Curb side',
    roadSide: 'Road side',
    frontFace: 'Front face',
    rearFace: 'Rear face',
  };

  it('moves aside for what is there, and leaves out what finds no place', () => {
    const inTheWay = { x: 30, y: 180, width: 30, height: 40 };
    const front = sheetTexts(frame, 13, words, [inTheWay]).find(({ key }) => key === 'front');
    expect(front!.at.y).not.toBe(200);
    const everywhere = { x: 0, y: 0, width: 900, height: 900 };
    expect(sheetTexts(frame, 13, words, [everywhere])).toEqual([]);
  });
});
