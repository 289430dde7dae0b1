import type { LampTechnology } from '../harness';
import type { Sourced } from './sourced';

export type LampUse = 'marker' | 'stopTurn' | 'tail' | 'plate';

/** What a lamp draws from 12 V where nobody has read its label. */
export interface LampCurrent extends Sourced {
  technology: LampTechnology;
  /** `marker` stands for marker, clearance and identification lamps alike. */
  use: LampUse;
  /** To start from; absent where common practice gives only the range. */
  amps?: number;
  leastAmps?: number;
  mostAmps?: number;
}

const led = {
  technology: 'led',
  source: "Common practice, from memory; to be replaced by the figure on the lamp's label",
  standing: 'memory',
} as const;
const filament = {
  technology: 'filament',
  source: 'Estimating rule of a towing-wiring page, rounded up',
  standing: 'secondary',
} as const;

export const LAMP_CURRENTS: readonly LampCurrent[] = [
  { use: 'marker', amps: 0.05, leastAmps: 0.03, mostAmps: 0.1, ...led },
  { use: 'stopTurn', amps: 0.35, leastAmps: 0.2, mostAmps: 0.5, ...led },
  { use: 'tail', amps: 0.04, leastAmps: 0.02, mostAmps: 0.06, ...led },
  { use: 'plate', leastAmps: 0.03, mostAmps: 0.1, ...led },
  { use: 'stopTurn', amps: 2, ...filament },
  { use: 'tail', amps: 1, ...filament },
  { use: 'marker', amps: 0.5, ...filament },
];
