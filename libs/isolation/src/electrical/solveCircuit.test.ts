import { HARNESS_FORMAT, type Harness, type Part } from '@lampwright/harness';
import { solveCircuit, type Short } from './solveCircuit';

/**
 * The nodal fixture (ours; its figures come from a matrix solver and from a formula by hand, two programs): 8 m of
 * 2.5 mm2 to n1, 3 m of 1.5 to the lamp n2, 4 m of 1.5 to n3, 2 m of 0.75 to n4. The lamp is 6.857143 ohm.
 */
const splice = (id: string): Part => ({
  id,
  kind: 'splice',
  label: id,
  at: { along: 0, across: 0 },
});
const circuits = ['c'];
const fixture: Harness = {
  format: HARNESS_FORMAT,
  name: 'Nodal fixture',
  supply: { volts: 12, connector: 'SAE J560' },
  circuits: [{ id: 'c', name: 'C' }],
  parts: [
    { ...splice('n0'), kind: 'inlet' },
    splice('n1'),
    {
      ...splice('n2'),
      kind: 'lamp',
      lamp: { loads: [{ circuit: 'c', amps: 1.75 }], technology: 'filament' },
    },
    splice('n3'),
    splice('n4'),
  ],
  runs: [
    { id: 'r1', from: 'n0', to: 'n1', circuits, metres: 8, conductor: { mm2: 2.5 } },
    { id: 'r2', from: 'n1', to: 'n2', circuits, metres: 3, conductor: { mm2: 1.5 } },
    { id: 'r3', from: 'n1', to: 'n3', circuits, metres: 4, conductor: { mm2: 1.5 } },
    { id: 'r4', from: 'n3', to: 'n4', circuits, metres: 2, conductor: { mm2: 0.75 } },
  ],
};

const solve = (...shorts: Short[]) =>
  solveCircuit(fixture, 'c', { volts: 12.6, sourceOhms: 0.02, shorts });
const n4 = { kind: 'part', id: 'n4' } as const;

describe('solveCircuit', () => {
  it('gives the nodal fixture without a short', () => {
    const { amps, volts } = solve();
    expect(amps).toBeCloseTo(1.804929, 6);
    expect(volts.get('n1')).toBeCloseTo(12.448675, 6);
  });

  it('gives the nodal fixture with 0.01 ohm at n4', () => {
    const { amps, volts, shortAmps } = solve({ place: n4, ohms: 0.01 });
    expect(amps).toBeCloseTo(63.911555, 6);
    expect(volts.get('n1')).toBeCloseTo(7.241655, 6);
    expect(volts.get('n2')).toBeCloseTo(7.199762, 6);
    expect(volts.get('n3')).toBeCloseTo(3.897419, 6);
    expect(volts.get('n4')).toBeCloseTo(0.628616, 6);
    expect(shortAmps[0]).toBeCloseTo(62.8616, 4);
  });

  it('gives the nodal fixture with 0.5 ohm at n4', () => {
    expect(solve({ place: n4, ohms: 0.5 }).amps).toBeCloseTo(19.680766, 6);
  });
});
