import type { Step } from '@lampwright/trace';

export const STEPS = [
  'intake',
  'makeSafe',
  'confirm',
  'narrow',
  'inspect',
  'repair',
  'prove',
  'reconnect',
  'lampCheck',
  'sign',
  'signed',
  'abandoned',
] as const satisfies Step[];

/** Steps in which a trace is over. */
export const CLOSED_STEPS: Step[] = ['signed', 'abandoned'];
