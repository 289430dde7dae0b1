import {
  circuitTree,
  pathToInlet,
  type CircuitId,
  type CircuitTree,
  type Harness,
  type Run,
  type RunId,
} from '@lampwright/harness';
import { conductorOhms } from './conductors';
import { preeceAmps } from './fusing';
import { PVC_K, withstand } from './heating';
import { solveCircuit, type Short, type SolveOptions } from './solveCircuit';

/** What a run on the way to the short carries and stands. */
export interface RunUnderFault {
  run: RunId;
  /** At the run's feed end. */
  amps: number;
  /** Seconds until PVC insulation is past what it stands, with no heat leaving; `valid` up to 5 s. */
  withstand: { seconds: number; valid: boolean };
  /** Amps that in the end melt the bare conductor in still air (Preece). */
  fusingAmps: number;
}

/** A short under power, while nothing trips. */
export interface FaultFacts {
  /** Through the short. */
  amps: number;
  /** From the source, the lamps' included. */
  sourceAmps: number;
  /** Volts left across the short, and lost on the way to it from the source. */
  volts: { left: number; lost: number };
  /** The runs from the inlet to the short; empty where no power comes to it. */
  path: RunUnderFault[];
  /** The run of the path that stands it least. */
  weakest: RunId | null;
}

/**
 * What would flow through a short, and what that does to the wires on the way. O(parts + runs).
 *
 * @throws UnknownCircuitError
 * @throws UnknownSpotError
 * @throws RangeError as `solveCircuit` does.
 */
export function faultFacts(
  harness: Harness,
  circuit: CircuitId,
  short: Short,
  options: Omit<SolveOptions, 'shorts'> = {},
): FaultFacts {
  const solution = solveCircuit(harness, circuit, { ...options, shorts: [short] });
  const amps = solution.shortAmps[0] ?? 0;
  const { volts = harness.supply.volts } = options;
  const path = amps > 0 ? runsTo(circuitTree(harness, circuit), harness, short) : [];
  const runs = path.map((run) => underFault(run, solution.runAmps.get(run.id) ?? 0));
  const least = Math.min(...runs.map((run) => run.withstand.seconds));
  const left = amps * short.ohms;
  return {
    amps,
    sourceAmps: solution.amps,
    volts: { left, lost: volts - left },
    path: runs,
    weakest: runs.find((run) => run.withstand.seconds === least)?.run ?? null,
  };
}

function runsTo(tree: CircuitTree, harness: Harness, { place }: Short): Run[] {
  const end = place.kind === 'part' ? place.id : harness.runs.find(({ id }) => id === place.id)?.to;
  if (end === undefined) return [];
  return pathToInlet(tree, end)
    .flatMap(({ feed }) => feed ?? [])
    .reverse();
}

function underFault(run: Run, amps: number): RunUnderFault {
  const { areaMm2 } = conductorOhms(run.conductor);
  const diameterMm = Math.sqrt(areaMm2 / (Math.PI / 4));
  return {
    run: run.id,
    amps,
    withstand: withstand(areaMm2, amps, PVC_K),
    fusingAmps: preeceAmps(diameterMm),
  };
}
