import type { Timing } from './types';

/** The times that hold until a shop sets its own: power at the front, switched on foot, a feed that resets at once. */
export const DEFAULT_TIMING: Readonly<Timing> = {
  powerSeconds: 15,
  walkSecondsPerMetre: 1,
  powerAlong: 0,
  overloadSeconds: 0,
};
