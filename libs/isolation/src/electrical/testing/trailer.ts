import {
  HARNESS_FORMAT,
  type Harness,
  type LampTechnology,
  type Part,
  type Run,
} from '@lampwright/harness';

export const CIRCUIT = 'tail';

const circuits = [CIRCUIT];
const separable = { openSeconds: 20, closeSeconds: 20 };
const at = { along: 0, across: 0 };

export interface TrailerOptions {
  technology?: LampTechnology;
  /** Of each of the four lamps. Default 0.6. */
  amps?: number;
}

/**
 * A trailer in small, all of it 14 AWG: inlet - 2 m - plug p1 - 4 m - splice s1 - 3 m - plug p2 - 1 m - splice s2, with
 * the separable lamps front1 and front2 1 m from s1, and the lamps rear1 and rear2 1 m from s2.
 */
export function trailer({ technology = 'filament', amps = 0.6 }: TrailerOptions = {}): Harness {
  const lamp = (id: string): Part => ({
    id,
    kind: 'lamp',
    label: id,
    at,
    separable,
    lamp: { loads: [{ circuit: CIRCUIT, amps }], technology },
  });
  return {
    format: HARNESS_FORMAT,
    name: 'A trailer in small',
    supply: { volts: 12, connector: 'SAE J560' },
    circuits: [{ id: CIRCUIT, name: 'Tail', protection: { amps: 20, kind: 'auto-reset' } }],
    parts: [
      { id: 'inlet', kind: 'inlet', label: 'inlet', at },
      { id: 'p1', kind: 'plug', label: 'p1', at, separable },
      { id: 's1', kind: 'splice', label: 's1', at },
      lamp('front1'),
      lamp('front2'),
      { id: 'p2', kind: 'plug', label: 'p2', at, separable },
      { id: 's2', kind: 'splice', label: 's2', at },
      lamp('rear1'),
      lamp('rear2'),
    ],
    runs: [
      run('to-p1', 'inlet', 'p1', 2),
      run('to-s1', 'p1', 's1', 4),
      run('to-front1', 's1', 'front1', 1),
      run('to-front2', 's1', 'front2', 1),
      run('to-p2', 's1', 'p2', 3),
      run('to-s2', 'p2', 's2', 1),
      run('to-rear1', 's2', 'rear1', 1),
      run('to-rear2', 's2', 'rear2', 1),
    ],
  };
}

function run(id: string, from: string, to: string, metres: number): Run {
  return { id, from, to, circuits, metres, conductor: { awg: 14 } };
}
