import type { TraceSettings } from './record';

/**
 * What a new shop starts with, in seconds and metres. Common practice, no source: no public data say how long a
 * power-up, a breaker that cools or a fuse to replace takes. A shop's own times replace them.
 */
export const defaultSettings: TraceSettings = {
  powerSeconds: 15,
  walkSecondsPerMetre: 1,
  powerAlong: 0,
  overloadSeconds: { seriesLamp: 0, tester: 5, breaker: 40, fuse: 60, ohmmeter: 0 },
  overloadLimit: 3,
  detection: { steady: 1, comesAndGoes: 0.7 },
};
