import type { TraceEvent } from './events';

/** The events that still stand, oldest first: without those taken back, and without the taking back. O(events). */
export function effectiveEvents(events: readonly TraceEvent[]): TraceEvent[] {
  const standing: TraceEvent[] = [];
  for (const event of events) {
    if (event.type !== 'event.undone') standing.push(event);
    else if (standing.at(-1)?.id === event.target) standing.pop();
  }
  return standing;
}
