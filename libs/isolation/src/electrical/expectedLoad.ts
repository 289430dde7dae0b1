import type { CircuitId, Harness, PartId } from '@lampwright/harness';
import type { Feeding } from './feeding';
import { bandOf, type LampBands } from './lampBand';
import { solveCircuit } from './solveCircuit';

/** Amps, and the bounds that lamps and supply leave them. */
export interface AmpsBand {
  amps: number;
  least: number;
  most: number;
}

export interface LoadOptions extends Feeding {
  bands?: LampBands;
}

export interface ExpectedLoad extends AmpsBand {
  /** What each energised load adds, in the order of the circuit; parts that draw nothing are not in it. */
  loads: ReadonlyMap<PartId, AmpsBand>;
}

/**
 * What a healthy circuit draws while exactly these points are open: the amps at the plan's loads less what the wires
 * take, within the bands of its lamps, all of which may lie on the same side. O(parts + runs).
 *
 * @throws UnknownCircuitError
 * @throws RangeError as `solveCircuit` does.
 */
export function expectedLoad(
  harness: Harness,
  circuit: CircuitId,
  open: readonly PartId[] = [],
  options: LoadOptions = {},
): ExpectedLoad {
  const { loadAmps } = solveCircuit(harness, circuit, { ...options, open });
  const partById = new Map(harness.parts.map((part) => [part.id, part]));
  const loads = new Map<PartId, AmpsBand>();
  const sum = { amps: 0, least: 0, most: 0 };
  for (const [id, amps] of loadAmps) {
    const part = partById.get(id);
    if (!part || amps === 0) continue;
    const { least, most } = bandOf(part, options.bands);
    const load = { amps, least: least * amps, most: most * amps };
    loads.set(id, load);
    sum.amps += load.amps;
    sum.least += load.least;
    sum.most += load.most;
  }
  return { ...sum, loads };
}
