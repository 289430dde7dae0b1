import type { Sourced } from '@lampwright/harness';

/** Where `AIRCRAFT_WIRES` is from. */
export const AIRCRAFT_WIRES_SOURCE: Sourced = {
  source: 'FAA AC 43.13-1B (change 1, 27 September 2001), Table 11-9',
  standing: 'read',
};

/**
 * The most that tin-plated stranded copper reads at 20 °C, in ohm per 1000 ft, by AWG size. The nearest official table
 * to a real harness wire: up to 27 % above solid copper.
 */
export const AIRCRAFT_WIRES: ReadonlyMap<number, number> = new Map([
  [24, 28.4],
  [22, 16.2],
  [20, 9.88],
  [18, 6.23],
  [16, 4.81],
  [14, 3.06],
  [12, 2.02],
  [10, 1.26],
  [8, 0.7],
  [6, 0.44],
  [4, 0.28],
  [2, 0.18],
  [1, 0.15],
  [0, 0.12],
]);
