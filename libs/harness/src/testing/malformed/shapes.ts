import { HARNESS_FORMAT } from '../../harness';
import { plan, withCircuit, withPart, withRun, type MalformedPlan } from './damage';

const PART_KINDS = ['inlet', 'plug', 'splice', 'lamp', 'module'];

/** Documents whose values have the wrong type, are missing, or are not among those allowed. */
export const misshapenPlans: MalformedPlan[] = [
  {
    name: 'a list instead of a plan',
    document: [],
    faults: [{ code: 'wrongType', path: '', found: 'array', wanted: 'object' }],
  },
  {
    name: 'nothing at all',
    document: null,
    faults: [{ code: 'wrongType', path: '', found: 'null', wanted: 'object' }],
  },
  {
    name: 'no format',
    document: plan({ format: undefined }),
    faults: [{ code: 'missing', path: 'format', wanted: HARNESS_FORMAT }],
  },
  {
    name: 'a format of the future, with other faults that are not looked at',
    document: plan({ format: 'lampwright-harness/2', parts: 5, runs: null }),
    faults: [
      {
        code: 'wrongFormat',
        path: 'format',
        found: 'lampwright-harness/2',
        wanted: HARNESS_FORMAT,
      },
    ],
  },
  {
    name: 'a format that is a number',
    document: plan({ format: 1 }),
    faults: [{ code: 'wrongFormat', path: 'format', found: 'number', wanted: HARNESS_FORMAT }],
  },
  {
    name: 'nothing but a format',
    document: { format: HARNESS_FORMAT },
    faults: [
      { code: 'missing', path: 'name', wanted: 'string' },
      { code: 'missing', path: 'supply', wanted: 'object' },
      { code: 'missing', path: 'circuits', wanted: 'array' },
      { code: 'missing', path: 'parts', wanted: 'array' },
      { code: 'missing', path: 'runs', wanted: 'array' },
    ],
  },
  {
    name: 'lists that are no lists',
    document: plan({ circuits: {}, parts: 'none', runs: 0 }),
    faults: [
      { code: 'wrongType', path: 'circuits', found: 'object', wanted: 'array' },
      { code: 'wrongType', path: 'parts', found: 'string', wanted: 'array' },
      { code: 'wrongType', path: 'runs', found: 'number', wanted: 'array' },
    ],
  },
  {
    name: 'a name of spaces',
    document: plan({ name: '   ' }),
    faults: [{ code: 'empty', path: 'name' }],
  },
  {
    name: 'a supply of 48 volts',
    document: plan({ supply: { volts: 48, connector: 'SAE J560' } }),
    faults: [{ code: 'notAllowed', path: 'supply.volts', found: 48, others: ['12', '24'] }],
  },
  {
    name: 'volts as text, and no connector',
    document: plan({ supply: { volts: '12' } }),
    faults: [
      { code: 'notAllowed', path: 'supply.volts', found: '12', others: ['12', '24'] },
      { code: 'missing', path: 'supply.connector', wanted: 'string' },
    ],
  },
  {
    name: 'a circuit that is a word',
    document: plan({ circuits: ['tail'], parts: [], runs: [] }),
    faults: [
      { code: 'wrongType', path: 'circuits[0]', found: 'string', wanted: 'object' },
      { code: 'noInlet', path: 'parts', found: 0, wanted: 1 },
    ],
  },
  {
    name: 'a circuit without a name, on half a pin',
    document: withCircuit('stop', { name: undefined, pin: 4.5 }),
    faults: [
      { code: 'missing', path: 'circuits[1].name', id: 'stop', wanted: 'string' },
      { code: 'notWhole', path: 'circuits[1].pin', id: 'stop', found: 4.5 },
    ],
  },
  {
    name: 'a circuit on pin 0',
    document: withCircuit('stop', { pin: 0 }),
    faults: [{ code: 'notPositive', path: 'circuits[1].pin', id: 'stop', found: 0 }],
  },
  {
    name: 'a protection of an unknown kind',
    document: withCircuit('tail', { protection: { amps: 15, kind: 'breaker' } }),
    faults: [
      {
        code: 'notAllowed',
        path: 'circuits[0].protection.kind',
        id: 'tail',
        found: 'breaker',
        others: ['auto-reset', 'manual-reset', 'fuse', 'electronic'],
      },
    ],
  },
  {
    name: 'a part of an unknown kind',
    document: withPart('s1', { kind: 'junction' }),
    faults: [
      {
        code: 'notAllowed',
        path: 'parts[2].kind',
        id: 's1',
        found: 'junction',
        others: PART_KINDS,
      },
    ],
  },
  {
    name: 'a part whose kind is an object',
    document: withPart('s1', { kind: {} }),
    faults: [
      { code: 'notAllowed', path: 'parts[2].kind', id: 's1', found: 'object', others: PART_KINDS },
    ],
  },
  {
    name: 'a part whose kind and label are missing',
    document: withPart('p1', { kind: undefined, label: undefined }),
    faults: [
      { code: 'missing', path: 'parts[1].kind', id: 'p1', others: PART_KINDS },
      { code: 'missing', path: 'parts[1].label', id: 'p1', wanted: 'string' },
    ],
  },
  {
    name: 'a part with every value of the wrong type',
    document: withPart('l2', {
      label: 7,
      at: 'rear',
      where: ['behind the bumper'],
      separable: true,
      faultWeight: '3',
      lamp: { loads: { tail: 0.04 }, technology: 1, colour: 'blue', functions: 'plate' },
    }),
    faults: [
      { code: 'wrongType', path: 'parts[4].label', id: 'l2', found: 'number', wanted: 'string' },
      { code: 'wrongType', path: 'parts[4].at', id: 'l2', found: 'string', wanted: 'object' },
      { code: 'wrongType', path: 'parts[4].where', id: 'l2', found: 'array', wanted: 'string' },
      {
        code: 'wrongType',
        path: 'parts[4].separable',
        id: 'l2',
        found: 'boolean',
        wanted: 'object',
      },
      {
        code: 'wrongType',
        path: 'parts[4].faultWeight',
        id: 'l2',
        found: 'string',
        wanted: 'number',
      },
      {
        code: 'wrongType',
        path: 'parts[4].lamp.loads',
        id: 'l2',
        found: 'object',
        wanted: 'array',
      },
      {
        code: 'notAllowed',
        path: 'parts[4].lamp.technology',
        id: 'l2',
        found: 1,
        others: ['led', 'filament'],
      },
      {
        code: 'notAllowed',
        path: 'parts[4].lamp.colour',
        id: 'l2',
        found: 'blue',
        others: ['amber', 'red', 'white'],
      },
      {
        code: 'wrongType',
        path: 'parts[4].lamp.functions',
        id: 'l2',
        found: 'string',
        wanted: 'array',
      },
    ],
  },
  {
    name: 'a lamp with a function that is no word',
    document: withPart('l2', {
      lamp: { loads: [{ circuit: 'tail', amps: 0.1 }], technology: 'led', functions: ['plate', 5] },
    }),
    faults: [
      {
        code: 'wrongType',
        path: 'parts[4].lamp.functions[1]',
        id: 'l2',
        found: 'number',
        wanted: 'string',
      },
    ],
  },
  {
    name: 'a place with null for a coordinate',
    document: withPart('s1', { at: { along: null } }),
    faults: [
      { code: 'wrongType', path: 'parts[2].at.along', id: 's1', found: 'null', wanted: 'number' },
      { code: 'missing', path: 'parts[2].at.across', id: 's1', wanted: 'number' },
    ],
  },
  {
    name: 'a part without an id, and one with an empty id',
    document: plan({
      parts: [
        { kind: 'inlet', label: 'Nose', at: { along: 0, across: 0 } },
        { id: '', kind: 'splice', label: 'Loose end', at: { along: 0, across: 0 } },
      ],
      runs: [],
    }),
    faults: [
      { code: 'missing', path: 'parts[0].id', wanted: 'string' },
      { code: 'empty', path: 'parts[1].id' },
    ],
  },
  {
    name: 'a run with nothing in it',
    document: withRun('w5', {
      id: undefined,
      from: undefined,
      to: undefined,
      circuits: undefined,
      metres: undefined,
      conductor: {},
    }),
    faults: [
      { code: 'missing', path: 'runs[4].id', wanted: 'string' },
      { code: 'missing', path: 'runs[4].from', wanted: 'string' },
      { code: 'missing', path: 'runs[4].to', wanted: 'string' },
      { code: 'missing', path: 'runs[4].circuits', wanted: 'array' },
      { code: 'missing', path: 'runs[4].metres', wanted: 'number' },
      { code: 'missing', path: 'runs[4].conductor', others: ['awg', 'mm2'] },
    ],
  },
  {
    name: 'a run that carries nothing',
    document: withRun('w5', { circuits: [] }),
    faults: [{ code: 'empty', path: 'runs[4].circuits', id: 'w5' }],
  },
  {
    name: 'a run whose circuit is a number',
    document: withRun('w5', { circuits: ['stop', 7] }),
    faults: [
      {
        code: 'wrongType',
        path: 'runs[4].circuits[1]',
        id: 'w5',
        found: 'number',
        wanted: 'string',
      },
    ],
  },
  {
    name: 'a conductor sized twice',
    document: withRun('w4', { conductor: { awg: 12, mm2: 3 } }),
    faults: [
      {
        code: 'strayData',
        path: 'runs[3].conductor.mm2',
        id: 'w4',
        found: 'mm2',
        wanted: 'awg',
      },
    ],
  },
  {
    name: 'no circuits',
    document: plan({
      circuits: [],
      parts: [{ id: 'nose', kind: 'inlet', label: 'Nose', at: { along: 0, across: 0 } }],
      runs: [],
    }),
    faults: [{ code: 'empty', path: 'circuits' }],
  },
  {
    name: 'every list empty',
    document: plan({ circuits: [], parts: [], runs: [] }),
    faults: [
      { code: 'empty', path: 'circuits' },
      { code: 'noInlet', path: 'parts', found: 0, wanted: 1 },
    ],
  },
];
