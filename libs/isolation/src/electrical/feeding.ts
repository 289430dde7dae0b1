import type { Conductor, Harness } from '@lampwright/harness';
import { conductorOhms } from './conductors';
import { ohmsAt } from './copper';
import type { Source } from './resistorTree';

/** What feeds a circuit, and how warm its wires are. */
export interface Feeding {
  /** At the source while nothing is drawn. Default the plan's nominal voltage. */
  volts?: number;
  /** Of the source, its protection, its cable and contacts, up to the inlet. Default 0. */
  sourceOhms?: number;
  /** Of the way back to the source, shared by all. Default 0. */
  returnOhms?: number;
  /** Of the copper. Default 20. */
  copperCelsius?: number;
}

/**
 * The feed as one voltage with ohms in series; volts are then measured to the trailer's own ground.
 *
 * @throws RangeError for volts that are not positive, or ohms that are negative or no number.
 */
export function sourceOf(harness: Harness, feeding: Feeding): Source {
  const { volts = harness.supply.volts, sourceOhms = 0, returnOhms = 0 } = feeding;
  if (!(volts > 0)) throw new RangeError(`volts must be more than 0, not ${volts}`);
  return {
    volts,
    ohms: notNegative('sourceOhms', sourceOhms) + notNegative('returnOhms', returnOhms),
  };
}

/** Ohm per metre to reckon with, at a temperature. */
export function usualOhmsPerMetre(celsius = 20): (conductor: Conductor | undefined) => number {
  return (conductor) => ohmsAt(conductorOhms(conductor).usual, celsius);
}

/** @throws RangeError */
export function notNegative(name: string, value: number): number {
  if (value >= 0) return value;
  throw new RangeError(`${name} must be 0 or more, not ${value}`);
}
