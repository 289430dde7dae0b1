import {
  circuitTree,
  type CircuitId,
  type CircuitNode,
  type Harness,
  type PartId,
} from '@lampwright/harness';
import { trueAmps, type Ammeter, type AmpsRange } from './ammeter';
import type { AmpsBand, ExpectedLoad } from './expectedLoad';

/** Loads that are fed through one part: without them the reading would be right. */
export interface DarkFit {
  /** The part nearest the inlet that feeds exactly these loads; the load itself where it is a single one. */
  at: PartId;
  /** How many loads that is; 1 for a single lamp. */
  loads: number;
  /** What they would draw. */
  amps: number;
}

/** Whether the reading is what is left of `all` without `dark`. */
export function couldBeDark(all: AmpsBand, dark: AmpsBand, read: AmpsRange): boolean {
  return all.least - dark.least <= read.most && read.least <= all.most - dark.most;
}

/**
 * Every single load, and every group of loads fed through one part, that may be dark; the best fit first, and of those
 * that the meter cannot tell apart the smallest. O((parts + runs) log parts).
 */
export function darkFits(
  harness: Harness,
  circuit: CircuitId,
  load: ExpectedLoad,
  reading: number,
  meter: Ammeter,
): DarkFit[] {
  const read = trueAmps(reading, meter);
  const { nodes } = circuitTree(harness, circuit);
  const behind = loadsBehind(nodes, load);
  const fits: DarkFit[] = [];
  const add = (at: PartId, dark: Group) => {
    if (couldBeDark(load, dark, read)) fits.push({ at, loads: dark.loads, amps: dark.amps });
  };
  for (const { part, feed } of nodes) {
    const dark = behind.get(part.id);
    const own = load.loads.get(part.id);
    const told = feed && behind.get(feed.from)?.loads === dark?.loads;
    if (dark && dark.loads > 1 && !told) add(part.id, dark);
    if (own) add(part.id, { ...own, loads: 1 });
  }
  const misfit = ({ amps }: DarkFit) =>
    Math.round(Math.abs(load.amps - amps - reading) / meter.resolution);
  return fits.sort((a, b) => misfit(a) - misfit(b) || a.loads - b.loads);
}

interface Group extends AmpsBand {
  loads: number;
}

/** By part: all that it draws and feeds. */
function loadsBehind(nodes: readonly CircuitNode[], load: ExpectedLoad): Map<PartId, Group> {
  const behind = new Map<PartId, Group>();
  for (const { part, runs } of nodes.toReversed()) {
    const own = load.loads.get(part.id);
    const sum = { amps: 0, least: 0, most: 0, loads: own ? 1 : 0, ...own };
    for (const { to } of runs) {
      const beyond = behind.get(to);
      sum.amps += beyond?.amps ?? 0;
      sum.least += beyond?.least ?? 0;
      sum.most += beyond?.most ?? 0;
      sum.loads += beyond?.loads ?? 0;
    }
    behind.set(part.id, sum);
  }
  return behind;
}
