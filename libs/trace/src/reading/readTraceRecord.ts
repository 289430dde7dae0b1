import { readHarness, type Harness } from '@lampwright/harness';
import type { TraceEvent } from '../events';
import { TRACE_FORMAT, type TraceRecord } from '../record';
import { eventSchema } from './eventSchema';
import { faultsOf, type TraceFault, type TraceReading } from './faults';
import { surroundingsSchema } from './recordSchema';
import { upcastEvents } from './upcast';

/**
 * Reads a stored or sent record, or says what is wrong with it. A record of an older format comes back in the one that
 * this program writes; one of a newer or unknown format is refused by name. Never throws.
 */
export function readTraceRecord(input: unknown): TraceReading<TraceRecord> {
  const format = formatFault(input);
  if (format) return { ok: false, faults: [format] };
  const surroundings = surroundingsSchema.safeParse(input);
  if (!surroundings.success) return { ok: false, faults: faultsOf(surroundings.error) };
  const { plan, events, ...rest } = surroundings.data;
  const faults: TraceFault[] = [];
  const harness = readPlan(plan.harness, faults);
  const read = readEvents(upcastEvents(rest.format, events), faults);
  if (!harness || faults.length > 0) return { ok: false, faults };
  return {
    ok: true,
    value: { ...rest, format: TRACE_FORMAT, plan: { ...plan, harness }, events: read },
  };
}

function formatFault(input: unknown): TraceFault | null {
  const format =
    typeof input === 'object' && input !== null && 'format' in input ? input.format : undefined;
  if (typeof format !== 'number') return { path: 'format', code: 'unknownFormat' };
  if (format > TRACE_FORMAT) return { path: 'format', code: 'newerFormat', found: format };
  return format === 1 || format === TRACE_FORMAT
    ? null
    : { path: 'format', code: 'unknownFormat', found: format };
}

function readPlan(input: unknown, faults: TraceFault[]): Harness | null {
  const reading = readHarness(input);
  if (reading.ok) return reading.harness;
  for (const plan of reading.faults) faults.push({ path: 'plan.harness', code: 'planFault', plan });
  return null;
}

function readEvents(inputs: readonly unknown[], faults: TraceFault[]): TraceEvent[] {
  const events: TraceEvent[] = [];
  const ids = new Set<string>();
  const last = new Map<string, number>();
  inputs.forEach((input, index) => {
    const path = `events[${index}]`;
    const result = eventSchema.safeParse(input);
    if (!result.success) {
      faults.push(...faultsOf(result.error, path));
      return;
    }
    const { id, device, seq } = result.data;
    if (ids.has(id)) faults.push({ path: `${path}.id`, code: 'repeatedId', found: id });
    if (seq !== (last.get(device) ?? 0) + 1) {
      faults.push({ path: `${path}.seq`, code: 'outOfSequence', found: seq });
    }
    ids.add(id);
    last.set(device, seq);
    events.push(result.data);
  });
  return events;
}
