import { withCircuit, withPart, withRun, type MalformedPlan } from './damage';

/** Plans with numbers that cannot be. NaN comes only from a program: JSON has no word for it. */
export const misnumberedPlans: MalformedPlan[] = [
  {
    name: 'a run of -2 metres',
    document: withRun('w1', { metres: -2 }),
    faults: [{ code: 'negative', path: 'runs[0].metres', id: 'w1', found: -2 }],
  },
  {
    name: 'a run of NaN metres',
    document: withRun('w1', { metres: NaN }),
    faults: [{ code: 'notFinite', path: 'runs[0].metres', id: 'w1', found: 'NaN' }],
  },
  {
    name: 'an infinite weight',
    document: withPart('p1', { faultWeight: Infinity }),
    faults: [{ code: 'notFinite', path: 'parts[1].faultWeight', id: 'p1', found: 'Infinity' }],
  },
  {
    name: 'a negative weight of a run',
    document: withRun('w2', { faultWeight: -0.5 }),
    faults: [{ code: 'negative', path: 'runs[1].faultWeight', id: 'w2', found: -0.5 }],
  },
  {
    name: 'times that are negative and infinite',
    document: withPart('p1', { separable: { openSeconds: -1, closeSeconds: -Infinity } }),
    faults: [
      { code: 'negative', path: 'parts[1].separable.openSeconds', id: 'p1', found: -1 },
      {
        code: 'notFinite',
        path: 'parts[1].separable.closeSeconds',
        id: 'p1',
        found: '-Infinity',
      },
    ],
  },
  {
    name: 'a lamp that gives current back',
    document: withPart('l2', {
      lamp: { loads: [{ circuit: 'tail', amps: -0.04 }], technology: 'led' },
    }),
    faults: [{ code: 'negative', path: 'parts[4].lamp.loads[0].amps', id: 'l2', found: -0.04 }],
  },
  {
    name: 'a part nowhere, and under the ground',
    document: withPart('s1', { at: { along: NaN, across: -1, up: -0.3 } }),
    faults: [
      { code: 'notFinite', path: 'parts[2].at.along', id: 's1', found: 'NaN' },
      { code: 'negative', path: 'parts[2].at.up', id: 's1', found: -0.3 },
    ],
  },
  {
    name: 'a conductor of no area',
    document: withRun('w5', { conductor: { mm2: 0 } }),
    faults: [{ code: 'notPositive', path: 'runs[4].conductor.mm2', id: 'w5', found: 0 }],
  },
  {
    name: 'a fuse of -15 A',
    document: withCircuit('tail', { protection: { amps: -15, kind: 'fuse' } }),
    faults: [{ code: 'negative', path: 'circuits[0].protection.amps', id: 'tail', found: -15 }],
  },
];
