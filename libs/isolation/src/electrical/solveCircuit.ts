import type { CircuitId, Harness, PartId, RunId } from '@lampwright/harness';
import { notNegative, sourceOf, usualOhmsPerMetre, type Feeding } from './feeding';
import { hotSiemens } from './loads';
import { networkFrom } from './network';
import { solveTree } from './resistorTree';
import { wiringOf, type Spot, type Terminal } from './wiring';

/** A connection to ground that should not be there. */
export interface Short extends Spot {
  ohms: number;
}

export interface SolveOptions extends Feeding {
  /** The separable points that are open. Default none. */
  open?: readonly PartId[];
  /** Default none. */
  shorts?: readonly Short[];
}

/** Voltages, to the trailer's own ground, and currents of one circuit under power. */
export interface CircuitSolution {
  /** Amps from the source. */
  amps: number;
  /** By part: volts at a plug's feed side, and beyond the contacts of everything else; 0 where no power comes. */
  volts: ReadonlyMap<PartId, number>;
  /** By part: amps through its load. */
  loadAmps: ReadonlyMap<PartId, number>;
  /** By run: amps at its feed end. */
  runAmps: ReadonlyMap<RunId, number>;
  /** Through each short, in their order. */
  shortAmps: number[];
}

/** The least ohms that a contact is taken to have: below a micro-ohm it changes nothing and would divide by zero. */
const LEAST_CONTACT_OHMS = 1e-6;

/**
 * Solves one circuit under power: lamps as the resistances they are at nominal voltage, wires as the plan draws them,
 * good contacts without resistance, any number of shorts. O(parts + runs).
 *
 * @throws UnknownCircuitError
 * @throws UnknownSpotError
 * @throws RangeError for volts that are not positive, or ohms that are negative or no number.
 */
export function solveCircuit(
  harness: Harness,
  circuit: CircuitId,
  options: SolveOptions = {},
): CircuitSolution {
  const { open, shorts = [], copperCelsius } = options;
  const wiring = wiringOf(harness, circuit, new Set(open), shorts);
  const siemens = hotSiemens(harness, circuit);
  const leaks = shorts.map(({ ohms }, at) => ({
    terminal: wiring.spots[at] ?? 0,
    siemens: 1 / Math.max(notNegative('ohms of a short', ohms), LEAST_CONTACT_OHMS),
  }));
  const model = { ohmsPerMetre: usualOhmsPerMetre(copperCelsius), siemens };
  const network = networkFrom(wiring, 0, model, leaks);
  const solution = solveTree(network.tree, sourceOf(harness, options));

  const voltsAt = (at: Terminal) => solution.volts[network.nodeAt.get(at) ?? -1] ?? 0;
  const runAmps = (id: RunId) => {
    const first = network.branchesOf.get(id)?.find(({ piece }) => piece.start === 0);
    return solution.amps[first?.node ?? -1] ?? 0;
  };
  const runs = harness.runs.filter(({ circuits }) => circuits.includes(circuit));
  return {
    amps: solution.amps[0] ?? 0,
    volts: new Map([...wiring.jointOf].map(([id, { whole }]) => [id, voltsAt(whole)])),
    loadAmps: new Map(
      wiring.parts.map(({ part, terminal }) => [part.id, voltsAt(terminal) * siemens(part)]),
    ),
    runAmps: new Map(runs.map(({ id }) => [id, runAmps(id)])),
    shortAmps: leaks.map((leak) => voltsAt(leak.terminal) * leak.siemens),
  };
}
