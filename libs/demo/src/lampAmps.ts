import type { LampTechnology } from '@lampwright/harness';

export type LampFunction =
  | 'tail'
  | 'stop'
  | 'turn'
  | 'mid-turn'
  | 'plate'
  | 'clearance'
  | 'side-marker'
  | 'identification'
  | 'abs'
  | 'inflation';

/**
 * Amps at 12 V.
 * Filament, from memory of SAE J573: no. 1157 for stop and tail (2.10 A, 0.59 A), 1156 for turn (2.10 A),
 * 67 for the plate (0.59 A), 194 for all markers (0.27 A).
 * LED, common practice, no source: about a tenth of the filament lamp.
 */
const AMPS: Record<LampTechnology, Record<LampFunction, number>> = {
  filament: {
    tail: 0.59,
    stop: 2.1,
    turn: 2.1,
    'mid-turn': 2.1,
    plate: 0.59,
    clearance: 0.27,
    'side-marker': 0.27,
    identification: 0.27,
    abs: 0.27,
    inflation: 0.27,
  },
  led: {
    tail: 0.04,
    stop: 0.35,
    turn: 0.35,
    'mid-turn': 0.2,
    plate: 0.05,
    clearance: 0.05,
    'side-marker': 0.05,
    identification: 0.05,
    abs: 0.05,
    inflation: 0.05,
  },
};

/** Amps that a lamp of this technology draws for one function. */
export function lampAmps(technology: LampTechnology, lampFunction: LampFunction): number {
  return AMPS[technology][lampFunction];
}
