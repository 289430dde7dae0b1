import { HARNESS_FORMAT, type Harness, type Part } from '../../harness';

const at = { along: 1, across: 0 };
const separable = { openSeconds: 20, closeSeconds: 10 };
const tail = { circuit: 'tail', amps: 0.04 };
const stop = { circuit: 'stop', amps: 0.35 };

const parts: Part[] = [
  { id: 'nose', kind: 'inlet', label: 'Nose socket', at },
  { id: 'p1', kind: 'plug', label: 'Sill plug', at, separable },
  { id: 's1', kind: 'splice', label: 'Rear splice', at },
  {
    id: 'l1',
    kind: 'lamp',
    label: 'Stop and tail lamp',
    at,
    separable,
    lamp: { loads: [tail, stop], technology: 'led', colour: 'red', functions: ['stop', 'tail'] },
  },
  {
    id: 'l2',
    kind: 'lamp',
    label: 'Plate lamp',
    at,
    lamp: { loads: [tail], technology: 'led' },
  },
  { id: 'm1', kind: 'module', label: 'Brake module', at, module: { loads: [stop] } },
];

/**
 * The valid plan that every malformed one is a damaged copy of. On `tail` and `stop`:
 * nose - w1 - p1 - w2 - s1 - w3 - l1; on `tail` s1 - w4 - l2; on `stop` p1 - w5 - m1.
 */
export const goodPlan: Harness = {
  format: HARNESS_FORMAT,
  name: 'Small trailer',
  supply: { volts: 12, connector: 'SAE J560' },
  circuits: [
    { id: 'tail', name: 'Tail', pin: 6, colour: 'brown', protection: { amps: 15, kind: 'fuse' } },
    { id: 'stop', name: 'Stop', pin: 4, colour: 'red' },
  ],
  parts,
  runs: [
    { id: 'w1', from: 'nose', to: 'p1', circuits: ['tail', 'stop'], metres: 6 },
    { id: 'w2', from: 'p1', to: 's1', circuits: ['tail', 'stop'], metres: 4 },
    { id: 'w3', from: 's1', to: 'l1', circuits: ['tail', 'stop'], metres: 1 },
    { id: 'w4', from: 's1', to: 'l2', circuits: ['tail'], metres: 0.5, conductor: { awg: 12 } },
    { id: 'w5', from: 'p1', to: 'm1', circuits: ['stop'], metres: 2, conductor: { mm2: 1.5 } },
  ],
};
