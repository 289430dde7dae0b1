import { goodPlan } from './goodPlan';
import { plan, withPart, withParts, withRun, withRuns, type MalformedPlan } from './damage';

const at = { along: 9, across: 0 };

/** Plans whose ids, references or parts contradict one another. */
export const contradictoryPlans: MalformedPlan[] = [
  {
    name: 'two circuits of one id',
    document: plan({ circuits: [...goodPlan.circuits, { id: 'tail', name: 'Tail again' }] }),
    faults: [{ code: 'duplicateId', path: 'circuits[2].id', id: 'tail', found: 'tail' }],
  },
  {
    name: 'two parts of one id',
    document: withPart('l2', { id: 'l1' }),
    faults: [
      { code: 'duplicateId', path: 'parts[4].id', id: 'l1', found: 'l1' },
      { code: 'unknownReference', path: 'runs[3].to', id: 'w4', found: 'l2' },
    ],
  },
  {
    name: 'two runs of one id',
    document: withRun('w2', { id: 'w1' }),
    faults: [{ code: 'duplicateId', path: 'runs[1].id', id: 'w1', found: 'w1' }],
  },
  {
    name: 'a run from a part that is not there',
    document: withRun('w3', { from: 's9' }),
    faults: [{ code: 'unknownReference', path: 'runs[2].from', id: 'w3', found: 's9' }],
  },
  {
    name: 'a run from and to what only a careless program would find',
    document: withRun('w3', { from: '__proto__', to: 'constructor' }),
    faults: [
      { code: 'unknownReference', path: 'runs[2].from', id: 'w3', found: '__proto__' },
      { code: 'unknownReference', path: 'runs[2].to', id: 'w3', found: 'constructor' },
    ],
  },
  {
    name: 'a run of a circuit that is not there',
    document: withRun('w5', { circuits: ['stopp'] }),
    faults: [{ code: 'unknownReference', path: 'runs[4].circuits[0]', id: 'w5', found: 'stopp' }],
  },
  {
    name: 'a run that names its circuit twice',
    document: withRun('w4', { circuits: ['tail', 'tail'] }),
    faults: [
      {
        code: 'duplicateCircuit',
        path: 'runs[3].circuits[1]',
        id: 'w4',
        found: 'tail',
        circuit: 'tail',
      },
    ],
  },
  {
    name: 'a load on a circuit that is not there',
    document: withPart('m1', { module: { loads: [{ circuit: 'abs', amps: 2 }] } }),
    faults: [
      {
        code: 'unknownReference',
        path: 'parts[5].module.loads[0].circuit',
        id: 'm1',
        found: 'abs',
      },
    ],
  },
  {
    name: 'a lamp with two loads on one circuit',
    document: withPart('l2', {
      lamp: {
        loads: [
          { circuit: 'tail', amps: 0.04 },
          { circuit: 'tail', amps: 0.05 },
        ],
        technology: 'led',
      },
    }),
    faults: [
      {
        code: 'duplicateLoad',
        path: 'parts[4].lamp.loads[1].circuit',
        id: 'l2',
        found: 'tail',
        circuit: 'tail',
      },
    ],
  },
  {
    name: 'a plug where the inlet should be',
    document: withPart('nose', { kind: 'plug' }),
    faults: [{ code: 'noInlet', path: 'parts', found: 0, wanted: 1 }],
  },
  {
    name: 'two inlets',
    document: withParts({ id: 'nose2', kind: 'inlet', label: 'Second socket', at }),
    faults: [
      {
        code: 'severalInlets',
        path: 'parts[6]',
        id: 'nose2',
        found: 2,
        wanted: 1,
        others: ['nose', 'nose2'],
      },
    ],
  },
  {
    name: 'an inlet that opens',
    document: withPart('nose', { separable: { openSeconds: 5, closeSeconds: 5 } }),
    faults: [{ code: 'inletSeparable', path: 'parts[0].separable', id: 'nose' }],
  },
  {
    name: 'a splice that opens',
    document: withPart('s1', { separable: { openSeconds: 5, closeSeconds: 5 } }),
    faults: [{ code: 'spliceSeparable', path: 'parts[2].separable', id: 's1' }],
  },
  {
    name: 'a lamp and a module with no data',
    document: plan({
      parts: goodPlan.parts.map(({ id, kind, label }) => ({ id, kind, label, at })),
    }),
    faults: [
      { code: 'lampWithoutData', path: 'parts[3].lamp', id: 'l1' },
      { code: 'lampWithoutData', path: 'parts[4].lamp', id: 'l2' },
      { code: 'moduleWithoutData', path: 'parts[5].module', id: 'm1' },
    ],
  },
  {
    name: 'a plug with the data of a lamp',
    document: withPart('p1', { lamp: { loads: [], technology: 'led' } }),
    faults: [{ code: 'strayData', path: 'parts[1].lamp', id: 'p1', found: 'lamp', wanted: 'plug' }],
  },
  {
    name: 'a lamp with the data of a module as well',
    document: withPart('l2', { module: { loads: [] } }),
    faults: [
      { code: 'strayData', path: 'parts[4].module', id: 'l2', found: 'module', wanted: 'lamp' },
    ],
  },
  {
    name: 'a run back to its own part',
    document: withRuns({ id: 'w6', from: 's1', to: 's1', circuits: ['tail'], metres: 1 }),
    faults: [{ code: 'runToItself', path: 'runs[5]', id: 'w6', found: 's1' }],
  },
  {
    name: 'a run drawn the wrong way round, into the inlet',
    document: withRun('w1', { from: 'p1', to: 'nose' }),
    faults: [{ code: 'runIntoInlet', path: 'runs[0].to', id: 'w1', found: 'nose' }],
  },
];
