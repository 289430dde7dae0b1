import { goodPlan } from './goodPlan';
import {
  plan,
  withoutRun,
  withPart,
  withParts,
  withRun,
  withRuns,
  type MalformedPlan,
} from './damage';

const at = { along: 9, across: 0 };

/** Plans whose wires do not form one tree on each circuit, or whose loads do not fit them. */
export const misfedPlans: MalformedPlan[] = [
  {
    name: 'a loop that power reaches',
    document: withRuns({ id: 'w6', from: 's1', to: 'p1', circuits: ['tail'], metres: 1 }),
    faults: [
      {
        code: 'loop',
        path: 'runs[5]',
        id: 'w6',
        circuit: 'tail',
        found: 2,
        others: ['p1', 's1'],
      },
    ],
  },
  {
    name: 'a loop of its own, and what hangs on it',
    document: withRun('w2', { from: 'l1', circuits: ['tail', 'stop'] }),
    faults: [
      {
        code: 'loop',
        path: 'runs[2]',
        id: 'w3',
        circuit: 'tail',
        found: 2,
        others: ['l1', 's1'],
      },
      {
        code: 'loop',
        path: 'runs[2]',
        id: 'w3',
        circuit: 'stop',
        found: 2,
        others: ['l1', 's1'],
      },
    ],
  },
  {
    name: 'a lamp with two feeds',
    document: withRuns({ id: 'w6', from: 'p1', to: 'l2', circuits: ['tail'], metres: 3 }),
    faults: [
      {
        code: 'twoFeeds',
        path: 'parts[4]',
        id: 'l2',
        circuit: 'tail',
        found: 2,
        wanted: 1,
        others: ['w4', 'w6'],
      },
    ],
  },
  {
    name: 'two wires side by side',
    document: withRuns({ id: 'w6', from: 'nose', to: 'p1', circuits: ['stop'], metres: 6 }),
    faults: [
      {
        code: 'twoFeeds',
        path: 'parts[1]',
        id: 'p1',
        circuit: 'stop',
        found: 2,
        wanted: 1,
        others: ['w1', 'w6'],
      },
    ],
  },
  {
    name: 'a part that no run leads to',
    document: withParts({ id: 's2', kind: 'splice', label: 'Spare splice', at }),
    faults: [{ code: 'unreachable', path: 'parts[6]', id: 's2', found: 1 }],
  },
  {
    name: 'a missing run, and all that hangs on it',
    document: withoutRun('w2'),
    faults: [
      {
        code: 'unreachable',
        path: 'parts[2]',
        id: 's1',
        circuit: 'tail',
        found: 3,
        others: ['l1', 'l2'],
      },
      {
        code: 'unreachable',
        path: 'parts[2]',
        id: 's1',
        circuit: 'stop',
        found: 2,
        others: ['l1'],
      },
    ],
  },
  {
    name: 'a circuit that stops one run too early',
    document: withRun('w2', { circuits: ['tail'] }),
    faults: [
      {
        code: 'unreachable',
        path: 'parts[2]',
        id: 's1',
        circuit: 'stop',
        found: 2,
        others: ['l1'],
      },
    ],
  },
  {
    name: 'parts and no runs',
    document: plan({ runs: [] }),
    faults: ['p1', 's1', 'l1', 'l2', 'm1'].map((id, index) => ({
      code: 'unreachable',
      path: `parts[${index + 1}]`,
      id,
      found: 1,
    })),
  },
  {
    name: 'a lamp that draws nothing from a circuit that feeds it',
    document: withPart('l1', {
      lamp: { loads: [{ circuit: 'tail', amps: 0.04 }], technology: 'led' },
    }),
    faults: [{ code: 'loadMissing', path: 'parts[3].lamp.loads', id: 'l1', circuit: 'stop' }],
  },
  {
    name: 'a lamp with no loads',
    document: withPart('l1', { lamp: { loads: [], technology: 'led' } }),
    faults: [
      { code: 'loadMissing', path: 'parts[3].lamp.loads', id: 'l1', circuit: 'tail' },
      { code: 'loadMissing', path: 'parts[3].lamp.loads', id: 'l1', circuit: 'stop' },
    ],
  },
  {
    name: 'a lamp that draws from a circuit that does not feed it',
    document: withRun('w3', { circuits: ['tail'] }),
    faults: [
      { code: 'loadWithoutFeed', path: 'parts[3].lamp.loads[1]', id: 'l1', circuit: 'stop' },
    ],
  },
  {
    name: 'a module that draws from a circuit that does not feed it',
    document: withPart('m1', { module: { loads: [{ circuit: 'tail', amps: 1 }] } }),
    faults: [
      { code: 'loadWithoutFeed', path: 'parts[5].module.loads[0]', id: 'm1', circuit: 'tail' },
    ],
  },
  {
    name: 'many mistakes at once',
    document: plan({
      name: '',
      circuits: [...goodPlan.circuits, { id: 'turn', name: 'Left turn', pin: -3 }],
      parts: [
        ...goodPlan.parts.map((part) =>
          part.id === 's1'
            ? { ...part, label: null, separable: { openSeconds: 1, closeSeconds: 1 } }
            : part,
        ),
        { id: 'p1', kind: 'inlet', label: 'Nose again', at },
      ],
      runs: [
        ...goodPlan.runs,
        { id: 'w6', from: 'l2', to: 's1', circuits: ['tail'], metres: -1 },
        { id: 'w6', from: 's1', to: 'l9', circuits: ['turn'], metres: 1 },
      ],
    }),
    faults: [
      { code: 'empty', path: 'name' },
      { code: 'notPositive', path: 'circuits[2].pin', id: 'turn', found: -3 },
      { code: 'wrongType', path: 'parts[2].label', id: 's1', found: 'null', wanted: 'string' },
      { code: 'negative', path: 'runs[5].metres', id: 'w6', found: -1 },
      { code: 'duplicateId', path: 'parts[6].id', id: 'p1', found: 'p1' },
      { code: 'duplicateId', path: 'runs[6].id', id: 'w6', found: 'w6' },
      { code: 'unknownReference', path: 'runs[6].to', id: 'w6', found: 'l9' },
      { code: 'spliceSeparable', path: 'parts[2].separable', id: 's1' },
      {
        code: 'severalInlets',
        path: 'parts[6]',
        id: 'p1',
        found: 2,
        wanted: 1,
        others: ['nose', 'p1'],
      },
      {
        code: 'loop',
        path: 'runs[5]',
        id: 'w6',
        circuit: 'tail',
        found: 2,
        others: ['s1', 'l2'],
      },
    ],
  },
];
