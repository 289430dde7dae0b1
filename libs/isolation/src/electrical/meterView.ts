import {
  PartNotOnCircuitError,
  type CircuitId,
  type Conductor,
  type Harness,
  type PartId,
} from '@lampwright/harness';
import { conductorOhms, type ConductorOhms } from './conductors';
import { ohmsAt } from './copper';
import { COLD_FILAMENT, coldSiemens } from './loads';
import { networkFrom, type Network } from './network';
import { solveTree, type TreeSolution } from './resistorTree';
import { wiringOf, type Wiring } from './wiring';

/** Where a meter's lead is held; the other is on the trailer's ground. Power is off and the supply is unplugged. */
export interface MeterPoint {
  harness: Harness;
  circuit: CircuitId;
  /** A part that is open; the inlet to look into the whole trailer. One that cannot be opened is seen both ways. */
  point: PartId;
  /** `load` looks away from the inlet, `feed` back towards it. */
  side: 'feed' | 'load';
  /** Other points that are open. Default none. */
  open?: readonly PartId[];
  /** Of the copper. Default 20. */
  copperCelsius?: number;
}

/** The metered part of the circuit under one assumption about its wires and its lamps. */
export interface Assumed {
  network: Network;
  /** With 1 V at the point, so that amps are siemens. */
  solution: TreeSolution;
}

export type Assumption = 'least' | 'usual' | 'most';

/**
 * What a meter looks at. Raising any resistance raises the reading (Rayleigh), so `least` and `most` bound it: the
 * wires at their least and the filaments at their coldest, or both at their most.
 */
export interface MeterView extends Record<Assumption, Assumed> {
  wiring: Wiring;
}

/**
 * Looks into the harness from an opened point. O(parts + runs).
 *
 * @throws UnknownCircuitError
 * @throws PartNotOnCircuitError
 */
export function meterView(at: MeterPoint): MeterView {
  const { harness, circuit, point, side, open = [], copperCelsius = 20 } = at;
  const wiring = wiringOf(harness, circuit, new Set([...open, point]));
  const joint = wiring.jointOf.get(point);
  if (!joint) throw new PartNotOnCircuitError(point, circuit);
  const root = side === 'feed' ? joint.near : joint.far;

  const assume = (which: Assumption & keyof ConductorOhms): Assumed => {
    const ohmsPerMetre = (conductor: Conductor | undefined) =>
      ohmsAt(conductorOhms(conductor)[which], copperCelsius);
    const siemens = coldSiemens(harness, circuit, COLD_FILAMENT[which]);
    const network = networkFrom(wiring, root, { ohmsPerMetre, siemens });
    return { network, solution: solveTree(network.tree, { volts: 1, ohms: 0 }) };
  };
  return { wiring, least: assume('least'), usual: assume('usual'), most: assume('most') };
}
