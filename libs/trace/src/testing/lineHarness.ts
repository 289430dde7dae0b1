import { HARNESS_FORMAT, type Harness, type Part, type Run } from '@lampwright/harness';

/** A plug that takes five seconds to open and to close. */
export function plug(id: string, along: number): Part {
  return {
    id,
    kind: 'plug',
    label: `Plug ${id}`,
    at: { along, across: 0 },
    separable: { openSeconds: 5, closeSeconds: 5 },
  };
}

/** A lamp on one or more circuits that can be unplugged. */
export function lamp(id: string, along: number, circuits: string[]): Part {
  return {
    id,
    kind: 'lamp',
    label: `Lamp ${id}`,
    at: { along, across: 1 },
    separable: { openSeconds: 10, closeSeconds: 10 },
    lamp: {
      loads: circuits.map((circuit) => ({ circuit, amps: 0.3 })),
      technology: 'led',
      functions: ['tail'],
    },
  };
}

/** A run that joins two parts; its id is `from-to`. */
export function run(from: string, to: string, circuits: string[], metres = 4): Run {
  return { id: `${from}-${to}`, from, to, circuits, metres };
}

const both = ['tail', 'stop'];

/**
 * A small trailer that people can keep in their head. Two circuits share one line of three plugs; a lamp hangs on each
 * stretch, the last one on both circuits. `abs` feeds a module and no lamp.
 *
 *     inlet - p1 - p2 - p3 - l3
 *               \    \- l2
 *                \- l1
 */
export const lineHarness: Harness = {
  format: HARNESS_FORMAT,
  name: 'Line of three plugs',
  supply: { volts: 12, connector: 'SAE J560' },
  circuits: [
    { id: 'tail', name: 'Tail, clearance', pin: 3 },
    { id: 'stop', name: 'Stop', pin: 4 },
    { id: 'abs', name: 'ABS and auxiliary', pin: 7 },
  ],
  parts: [
    { id: 'inlet', kind: 'inlet', label: 'Front socket', at: { along: 0, across: 0 } },
    plug('p1', 3),
    plug('p2', 6),
    plug('p3', 9),
    lamp('l1', 4, ['tail']),
    lamp('l2', 7, ['tail']),
    lamp('l3', 12, both),
    {
      id: 'm1',
      kind: 'module',
      label: 'ABS module',
      at: { along: 10, across: 0 },
      module: { loads: [{ circuit: 'abs', amps: 2 }] },
    },
  ],
  runs: [
    run('inlet', 'p1', both),
    run('p1', 'p2', both),
    run('p2', 'p3', both),
    run('p3', 'l3', both),
    run('p1', 'l1', ['tail'], 1),
    run('p2', 'l2', ['tail'], 1),
    run('inlet', 'm1', ['abs'], 10),
  ],
};
