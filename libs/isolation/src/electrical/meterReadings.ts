import type { Location } from './locate';
import type { Assumed } from './meterView';
import { portAt } from './port';

/** Ohms that a meter sees without any short; Infinity where nothing conducts. */
export function healthyOhms({ solution }: Assumed): number {
  return 1 / (solution.amps[0] ?? 0);
}

/** Ohms that a meter sees with a short of `contact` ohms at a place. O(1). */
export function shortedOhms({ network, solution }: Assumed, at: Location, contact: number): number {
  const port = portAt(network.tree, solution, at.node, at.share);
  return 1 / ((solution.amps[0] ?? 0) + port.volts ** 2 / (port.ohms + contact));
}

/**
 * The other way round: the ohms of the short at a place that would give the reading. Negative where even a dead short
 * there would read more; Infinity where the lamps alone read no more. O(1).
 */
export function contactFor({ network, solution }: Assumed, at: Location, reading: number): number {
  const port = portAt(network.tree, solution, at.node, at.share);
  const left = 1 / reading - (solution.amps[0] ?? 0);
  return left > 0 ? port.volts ** 2 / left - port.ohms : Infinity;
}
