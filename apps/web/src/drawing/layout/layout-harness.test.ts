import type { Harness } from '@lampwright/harness';
import { arbitraryHarness, chain, largeCases } from '@lampwright/harness/testing';
import fc from 'fast-check';
import { boxAround, boxesOverlap, boxInside, growBox, type Box } from './geometry';
import { layoutHarness, type DrawingLayout } from './layout-harness';
import { wholeOf } from './frame';

const sheets = [
  { width: 720, height: 560 },
  { width: 800, height: 500 },
  { width: 370, height: 300 },
] as const;

function lay(harness: Harness, circuit: string | null, sheet: { width: number; height: number }) {
  return layoutHarness({ harness, circuit, keep: new Set(), sheet, compact: false });
}

function symbols(layout: DrawingLayout): Box[] {
  return layout.parts.map((part) => boxAround(layout.positions.get(part.id)!, layout.symbol));
}

function expectSound(layout: DrawingLayout) {
  const boxes = symbols(layout);
  const sheet = { x: 0, y: 0, ...layout.sheet };
  boxes.forEach((box, at) => {
    expect(boxInside(box, sheet)).toBe(true);
    for (const other of boxes.slice(at + 1)) expect(boxesOverlap(box, other)).toBe(false);
  });
  const whole = growBox(wholeOf(layout.frame), layout.symbol);
  for (const run of layout.runs) {
    const route = layout.routes.get(run.id)!;
    expect(route[0]).toEqual(layout.positions.get(run.from));
    expect(route.at(-1)).toEqual(layout.positions.get(run.to));
    route.forEach((point, at) => {
      expect(boxInside({ ...point, width: 0, height: 0 }, whole)).toBe(true);
      const before = route[at - 1];
      if (!before) return;
      const level = Math.abs(before.y - point.y) < 0.5;
      const upright = Math.abs(before.x - point.x) < 0.5;
      expect(level || upright).toBe(true);
    });
  }
}

describe('layoutHarness', () => {
  it('gives every part of any plan a place of its own on the sheet, and square wires', () => {
    fc.assert(
      fc.property(arbitraryHarness({ maxParts: 60 }), fc.constantFrom(...sheets), (plan, sheet) => {
        expectSound(lay(plan, null, sheet));
        expectSound(lay(plan, plan.circuits[0]!.id, sheet));
      }),
      { numRuns: 60 },
    );
  });

  it('lays out the large cases', () => {
    for (const { harness, circuit } of largeCases) {
      for (const sheet of sheets) expectSound(lay(harness, circuit, sheet));
    }
  });

  it('gives the same layout for the same plan', () => {
    const { harness, circuit } = largeCases.at(-1)!;
    expect(lay(harness, circuit, sheets[0])).toEqual(
      lay(structuredClone(harness), circuit, sheets[0]),
    );
  });

  it('shows an inlet alone', () => {
    const plan = chain(1);
    const inlet = { ...plan, parts: plan.parts.slice(0, 1), runs: [] };
    const layout = lay(inlet, null, sheets[2]);
    expect(layout.parts).toHaveLength(1);
    expectSound(layout);
  });

  it('does not break at a thousand parts', () => {
    const layout = lay(crowd(1000), null, sheets[0]);
    expect(layout.positions.size).toBe(1000);
    expect(layout.routes.size).toBe(999);
    const sheet = { x: 0, y: 0, ...layout.sheet };
    expect(symbols(layout).every((box) => boxInside(box, sheet))).toBe(true);
  });

  it('keeps the order along the trailer within a side', () => {
    fc.assert(
      fc.property(fc.array(fc.integer({ min: 10, max: 140 }), { maxLength: 18 }), (all) => {
        const plan = side(all.map((decimetres) => decimetres / 10));
        const layout = lay(plan, null, sheets[0]);
        const rail = layout.parts
          .filter((part) => part.kind === 'lamp')
          .sort((a, b) => a.at.along - b.at.along)
          .map((part) => layout.positions.get(part.id)!.x);
        expect(rail).toEqual([...rail].sort((a, b) => a - b));
      }),
    );
  });

  it('folds a crowded rear face out, and keeps its lamps in order of side and of height', () => {
    const plan = side([]);
    const at = (across: number, up: number) => ({ along: 16, across, up });
    const rear = [at(-1, 0.8), at(1, 0.8), at(-0.3, 3.9), at(0, 3.9), at(0.3, 3.9)];
    plan.parts.push(
      ...rear.map((position, index) => ({
        id: `rear${index}`,
        kind: 'lamp' as const,
        label: `Rear ${index}`,
        at: position,
        lamp: { loads: [{ circuit: 'marker', amps: 0.1 }], technology: 'led' as const },
      })),
    );
    plan.runs.push(
      ...rear.map((_, index) => ({
        id: `r${index}`,
        from: 'inlet',
        to: `rear${index}`,
        circuits: ['marker'],
        metres: 16,
      })),
    );
    const layout = lay(plan, null, sheets[0]);
    const place = (index: number) => layout.positions.get(`rear${index}`)!;
    expect(layout.frame.rear).not.toBeNull();
    expectSound(layout);
    // Curb side is up, the top of the face is at the right.
    expect(place(1).y).toBeLessThan(place(0).y);
    expect([2, 3, 4].map((index) => place(index).y)).toEqual(
      [2, 3, 4].map((index) => place(index).y).sort((a, b) => b - a),
    );
    for (const low of [0, 1])
      for (const high of [2, 3, 4]) expect(place(low).x).toBeLessThan(place(high).x);
  });

  it('leaves the other circuits as dots, but shows in full a point of theirs that is kept', () => {
    const { harness, circuit } = largeCases[0]!;
    const plan = structuredClone(harness);
    plan.circuits.push({ id: 'other', name: 'Other' });
    plan.parts.push({ id: 'odd', kind: 'plug', label: 'Odd', at: { along: 5, across: 0.4 } });
    plan.runs.push({ id: 'oddRun', from: 'inlet', to: 'odd', circuits: ['other'], metres: 5 });
    expect(lay(plan, circuit, sheets[0]).others).toHaveLength(1);
    const kept = layoutHarness({
      harness: plan,
      circuit,
      keep: new Set(['odd']),
      sheet: sheets[0],
      compact: false,
    });
    expect(kept.others).toHaveLength(0);
    expect(kept.positions.has('odd')).toBe(true);
  });
});

/** Lamps on the road-side rail, all fed from the inlet. */
function side(along: readonly number[]): Harness {
  return {
    format: 'lampwright-harness/1',
    name: 'side',
    supply: { volts: 12, connector: 'SAE J560' },
    circuits: [{ id: 'marker', name: 'Marker' }],
    parts: [
      { id: 'inlet', kind: 'inlet', label: 'Inlet', at: { along: 0, across: 0 } },
      ...along.map((metres, index) => ({
        id: `l${index}`,
        kind: 'lamp' as const,
        label: `Lamp ${index}`,
        at: { along: metres, across: -1.2 },
        lamp: { loads: [{ circuit: 'marker', amps: 0.1 }], technology: 'led' as const },
      })),
    ],
    runs: along.map((metres, index) => ({
      id: `w${index}`,
      from: 'inlet',
      to: `l${index}`,
      circuits: ['marker'],
      metres,
    })),
  };
}

function crowd(count: number): Harness {
  return side(Array.from({ length: count - 1 }, (_, index) => ((index * 7) % 160) / 10));
}
