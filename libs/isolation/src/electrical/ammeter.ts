/** How a clamp or bench meter reads amps. Common practice, no source: a hand-held DC clamp meter. */
export interface Ammeter {
  /** One step of the display, in amps; more than 0. */
  resolution: number;
  /** Of the reading, as a factor: 0.03 for 3 %. */
  tolerance: number;
}

export const DEFAULT_AMMETER: Ammeter = { resolution: 0.1, tolerance: 0.03 };

export interface AmpsRange {
  least: number;
  most: number;
}

/** The amps that a meter may turn into this reading: half a step and the tolerance, both ways, not below 0. */
export function trueAmps(
  reading: number,
  { resolution, tolerance }: Ammeter = DEFAULT_AMMETER,
): AmpsRange {
  const slack = resolution / 2 + tolerance * reading;
  return { least: Math.max(0, reading - slack), most: reading + slack };
}
