import type { TraceEvent } from '../events';
import { eventSchema } from './eventSchema';
import { faultsOf, type TraceReading } from './faults';

/**
 * Reads one event of the format that this program writes, or says what is wrong with it. Unknown keys are refused, so
 * that nothing is stored that nobody understands. Never throws.
 */
export function readTraceEvent(input: unknown): TraceReading<TraceEvent> {
  const result = eventSchema.safeParse(input);
  return result.success
    ? { ok: true, value: result.data }
    : { ok: false, faults: faultsOf(result.error) };
}
