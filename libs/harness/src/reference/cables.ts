import type { Sourced } from './sourced';

export interface CableConductor {
  awg: number;
  count: number;
  /** The least cross-section the standard allows for this size, in mm2, where known. */
  leastMm2?: number;
}

export interface Cable extends Sourced {
  name: string;
  /** Whether its antilock conductor carries antilock power. */
  antilock: boolean;
  conductors: readonly CableConductor[];
}

/** Seven-conductor cable between truck and trailer. */
export const CABLES: readonly Cable[] = [
  {
    name: 'SAE J1067',
    antilock: false,
    conductors: [
      { awg: 8, count: 1 },
      { awg: 10, count: 1 },
      { awg: 12, count: 5 },
    ],
    source: 'SAE J1067 (February 2020): rationale, foreword and scope',
    standing: 'read',
  },
  {
    name: 'SAE J2394',
    antilock: true,
    conductors: [
      { awg: 8, count: 1, leastMm2: 8.2 },
      { awg: 10, count: 2, leastMm2: 5.16 },
      { awg: 12, count: 4, leastMm2: 3.24 },
    ],
    source: 'Summary page of SAE J2394-2020, with its Table 1',
    standing: 'secondary',
  },
];
