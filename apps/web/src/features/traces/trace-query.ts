import type { TraceListQuery } from '@lampwright/contracts';
import type { Step } from '@lampwright/trace';

export const TRACE_FILTERS = ['state', 'step', 'trailerId', 'authorId', 'circuit'] as const;

export const STATES = ['open', 'signed', 'abandoned'] as const;

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
] as const satisfies Step[];

type Words = Partial<Record<(typeof TRACE_FILTERS)[number], string>>;

const one = <T extends string>(allowed: readonly T[], text: string | undefined): T | undefined =>
  allowed.find((value) => value === text);

/** The address as a request: an old link may hold a state or step that is none. */
export function toTraceQuery({ state, step, ...rest }: Words & object): TraceListQuery {
  const known = { state: one(STATES, state), step: one(STEPS, step) };
  return {
    ...rest,
    ...(known.state ? { state: known.state } : {}),
    ...(known.step ? { step: known.step } : {}),
  };
}
