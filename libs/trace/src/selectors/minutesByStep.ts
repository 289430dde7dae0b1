import { appendEvent } from '../appendEvent';
import type { TraceRecord } from '../record';
import type { Step } from '../state';
import { openTrace } from '../traceLog';
import { stepOf } from './stepOf';

const MILLISECONDS_A_MINUTE = 60_000;

/**
 * Minutes spent in each step, by the clocks of the devices: information, not measurement. Time between two events goes
 * to the step before the later one; a clock that went back counts nothing. O(events), and a fold more for each undo.
 */
export function minutesByStep(record: TraceRecord): Partial<Record<Step, number>> {
  const minutes: Partial<Record<Step, number>> = {};
  let log = openTrace({ ...record, events: [] });
  let before = Date.parse(record.openedAt);
  for (const event of record.events) {
    const at = Date.parse(event.at);
    const step = stepOf(log);
    const spent = Math.max(0, at - before) / MILLISECONDS_A_MINUTE;
    if (Number.isFinite(spent)) minutes[step] = (minutes[step] ?? 0) + spent;
    before = at;
    const outcome = appendEvent(log, event);
    if (outcome.ok) log = outcome.log;
  }
  return minutes;
}
