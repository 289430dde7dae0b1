import type { CaseSetting } from '@lampwright/harness/testing';
import { DEFAULT_TIMING } from '../timing';
import type { Timing } from '../types';

/** The three settings that the case files give figures for. */
export const settings: readonly { name: CaseSetting; timing: Timing }[] = [
  { name: 'walk', timing: DEFAULT_TIMING },
  { name: 'hand', timing: { ...DEFAULT_TIMING, walkSecondsPerMetre: 0 } },
  { name: 'breaker', timing: { ...DEFAULT_TIMING, walkSecondsPerMetre: 0, overloadSeconds: 40 } },
];
