import { HARNESS_FORMAT, type Harness, type Lamp, type Part, type Run } from '../harness';

/** The one circuit of `chain` and `star`. */
export const CIRCUIT = 'marker';

const circuits = [CIRCUIT];
const separable = { openSeconds: 20, closeSeconds: 10 };
const lamp: Lamp = { loads: [{ circuit: CIRCUIT, amps: 0.05 }], technology: 'led' };
const inlet: Part = { id: 'inlet', kind: 'inlet', label: 'Inlet', at: { along: 0, across: 0 } };

/** The inlet, then `n` separable plugs `p1` to `pn` in a row one metre apart, then the lamp `end`: n + 1 sections. */
export function chain(n: number): Harness {
  const plugs = numbers(n).map((i): Part => ({
    id: `p${i}`,
    kind: 'plug',
    label: `Plug ${i}`,
    at: at(i),
    separable,
  }));
  const end: Part = { id: 'end', kind: 'lamp', label: 'End lamp', at: at(n + 1), lamp };
  const parts = [inlet, ...plugs, end];
  const runs = parts.slice(1).map(({ id }, i) => run(i + 1, parts[i]?.id ?? inlet.id, id));
  return plan(`Chain of ${n}`, parts, runs);
}

/** The inlet with `n` separable lamps `l1` to `ln`, each on its own run: n + 1 sections. */
export function star(n: number): Harness {
  const lamps = numbers(n).map((i): Part => ({
    id: `l${i}`,
    kind: 'lamp',
    label: `Lamp ${i}`,
    at: at(i),
    separable,
    lamp,
  }));
  const runs = lamps.map(({ id }, i) => run(i + 1, inlet.id, id));
  return plan(`Star of ${n}`, [inlet, ...lamps], runs);
}

function plan(name: string, parts: Part[], runs: Run[]): Harness {
  return {
    format: HARNESS_FORMAT,
    name,
    supply: { volts: 12, connector: 'SAE J560' },
    circuits: [{ id: CIRCUIT, name: 'Clearance and side marker', pin: 2, colour: 'black' }],
    parts,
    runs,
  };
}

function run(i: number, from: string, to: string): Run {
  return { id: `w${i}`, from, to, circuits, metres: 1 };
}

function at(along: number): Part['at'] {
  return { along, across: 0 };
}

function numbers(n: number): number[] {
  return Array.from({ length: n }, (_, i) => i + 1);
}
