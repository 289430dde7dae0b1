import type { Harness, Part } from './harness';
import { sectionTree } from './sectionTree';
import { UnknownCircuitError } from './errors';

const at = { along: 1, across: 0 };
const separable = { openSeconds: 10, closeSeconds: 5 };
const loads = [{ circuit: 'c', amps: 0.1 }];

/** inlet - w1 - p1 (plug) - w2 - l1 (lamp) - w3 - l2 (lamp), each run one metre long. */
const plan: Harness = {
  format: 'lampwright-harness/1',
  name: 'Plug and two lamps in a row',
  supply: { volts: 12, connector: 'SAE J560' },
  circuits: [{ id: 'c', name: 'Tail' }],
  parts: [
    { id: 'in', kind: 'inlet', label: 'Inlet', at },
    { id: 'p1', kind: 'plug', label: 'Plug', at, separable },
    { id: 'l1', kind: 'lamp', label: 'Lamp 1', at, separable, lamp: { loads, technology: 'led' } },
    { id: 'l2', kind: 'lamp', label: 'Lamp 2', at, lamp: { loads, technology: 'led' } },
  ],
  runs: [
    { id: 'w1', from: 'in', to: 'p1', circuits: ['c'], metres: 1 },
    { id: 'w2', from: 'p1', to: 'l1', circuits: ['c'], metres: 1 },
    { id: 'w3', from: 'l1', to: 'l2', circuits: ['c'], metres: 1 },
  ],
};

const keys = (harness: Harness, options?: Parameters<typeof sectionTree>[2]) =>
  sectionTree(harness, 'c', options).sections.map((section) =>
    section.places.map(({ ref }) =>
      ref.kind === 'part' && ref.half ? `${ref.id}/${ref.half}` : ref.id,
    ),
  );

describe('sectionTree', () => {
  it('splits a separable plug and takes a separable lamp away alone', () => {
    expect(keys(plan)).toEqual([['in', 'w1', 'p1/feed'], ['p1/load', 'w2', 'w3', 'l2'], ['l1']]);
  });

  it('gives each section its parent, its point and its share of the weight', () => {
    const { sections } = sectionTree(plan, 'c');
    expect(sections.map(({ parent }) => parent)).toEqual([null, 0, 1]);
    expect(sections.map(({ children }) => children)).toEqual([[1], [2], []]);
    expect(sections[1]?.point).toEqual({ partId: 'p1', along: 1, ...separable });
    expect(sections[0]?.point).toBeNull();
    expect(sections.map(({ weight }) => weight)).toEqual([2.1, 4.2, 3]);
    expect(sections[2]?.probability).toBeCloseTo(3 / 9.3, 12);
  });

  it('takes a point that cannot be opened as one whole place', () => {
    expect(keys(plan, { notSeparable: new Set(['p1']) })).toEqual([
      ['in', 'w1', 'p1', 'w2', 'w3', 'l2'],
      ['l1'],
    ]);
  });

  it('multiplies weights by the factor', () => {
    const { sections } = sectionTree(plan, 'c', {
      factor: (ref) => (ref.kind === 'part' && ref.half === 'feed' ? 10 : 0),
    });
    expect(sections.map(({ weight }) => weight)).toEqual([10, 0, 0]);
    expect(sections.map(({ probability }) => probability)).toEqual([1, 0, 0]);
  });

  it('counts sections equally when every weight is 0', () => {
    const { sections } = sectionTree(plan, 'c', { factor: () => 0 });
    expect(sections.map(({ probability }) => probability)).toEqual([1 / 3, 1 / 3, 1 / 3]);
  });

  it('shares out weights whose sum is beyond what a number holds', () => {
    const parts: Part[] = plan.parts.map((part) => ({ ...part, faultWeight: 1.5e308 }));
    const { sections } = sectionTree({ ...plan, parts }, 'c');
    expect(sections.map(({ probability }) => probability)).toEqual([0.375, 0.375, 0.25]);
  });

  it('refuses a circuit that the plan does not have', () => {
    expect(() => sectionTree(plan, 'constructor')).toThrow(UnknownCircuitError);
  });

  it('leaves out runs of other circuits', () => {
    const other = plan.runs.map((run) => ({ ...run, circuits: run.id === 'w1' ? ['c'] : ['d'] }));
    expect(keys({ ...plan, runs: other })).toEqual([['in', 'w1', 'p1/feed'], ['p1/load']]);
  });
});
