/** How a multimeter reads ohms. */
export interface Ohmmeter {
  /** One step of the display, in ohms; more than 0. */
  resolution: number;
  /** Of the reading, as a factor: 0.01 for 1 %. */
  tolerance: number;
  /** What the leads read when they touch, taken off the reading; 0 where the meter was zeroed. */
  leadOhms: number;
  /** Above this the meter shows an open circuit. Default 20 megohm. */
  mostOhms?: number;
}

/** An ordinary hand-held meter on its lowest range. Common practice, no source. */
export const DEFAULT_OHMMETER: Ohmmeter = { resolution: 0.1, tolerance: 0.01, leadOhms: 0.2 };

/** Ohms, or `open` where the meter shows that nothing conducts. */
export type OhmsReading = number | 'open';

export interface OhmsRange {
  least: number;
  most: number;
}

/**
 * The ohms beyond the leads that a meter may turn into this reading: half a step and the tolerance, both ways. A reading
 * below the leads' own counts as none beyond them.
 */
export function trueOhms(reading: OhmsReading, meter: Ohmmeter = DEFAULT_OHMMETER): OhmsRange {
  const { resolution, tolerance, leadOhms, mostOhms = 20e6 } = meter;
  if (reading === 'open') return { least: mostOhms, most: Infinity };
  const slack = resolution / 2 + tolerance * reading;
  return {
    least: Math.max(0, reading - leadOhms - slack),
    most: Math.max(slack, reading - leadOhms + slack),
  };
}
