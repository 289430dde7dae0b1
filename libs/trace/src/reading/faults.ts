import type { HarnessFault } from '@lampwright/harness';
import type { z } from 'zod';

/** A fault in an event or a record that was read. It carries facts; the words are the web's. */
export interface TraceFault {
  /** `events[3].circuit`; empty for the whole. */
  path: string;
  code: TraceFaultCode;
  /** For `planFault`: what is wrong with the plan that the record carries. */
  plan?: HarnessFault;
  /** What stands there, where the fault is about a value: the format, the repeated id. */
  found?: string | number;
}

export type TraceFaultCode =
  /** A value of the wrong kind, out of its range, or not among those allowed; a key too many or too few. */
  | 'invalid'
  /** A text, list or number beyond what is accepted. */
  | 'tooBig'
  /** A key that the format does not have. */
  | 'unknownKey'
  /** A format that this program has never written. */
  | 'unknownFormat'
  /** A format of a newer program. */
  | 'newerFormat'
  | 'planFault'
  /** An id that an earlier event has. */
  | 'repeatedId'
  /** A device's numbers have a gap or go back. */
  | 'outOfSequence';

export type TraceReading<Value> = { ok: true; value: Value } | { ok: false; faults: TraceFault[] };

/** The most faults that are told. Ours: nobody reads more. */
const MOST_FAULTS = 100;

/** What a schema refused, as faults below `path`. */
export function faultsOf(error: z.ZodError, path = ''): TraceFault[] {
  return error.issues.slice(0, MOST_FAULTS).map((issue) => ({
    path: pathOf(path, issue.path),
    code: codeOf(issue.code),
  }));
}

function codeOf(code: string): TraceFaultCode {
  if (code === 'too_big') return 'tooBig';
  return code === 'unrecognized_keys' ? 'unknownKey' : 'invalid';
}

function pathOf(base: string, keys: readonly PropertyKey[]): string {
  return keys.reduce<string>((path, key) => {
    if (typeof key === 'number') return `${path}[${key}]`;
    return path === '' ? String(key) : `${path}.${String(key)}`;
  }, base);
}
