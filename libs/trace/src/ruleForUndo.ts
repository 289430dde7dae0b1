import type { EventOf } from './eventOf';
import type { TraceEvent } from './events';
import { refuse } from './rules/rule';
import type { Refusal } from './state';

/** Only the newest event that still stands can be taken back, one at a time; taking back is not taken back. */
export function ruleForUndo(
  effective: readonly TraceEvent[],
  event: EventOf<'event.undone'>,
): Refusal | null {
  const newest = effective.at(-1);
  if (!newest) return refuse('nothingToUndo', [event.target]);
  return newest.id === event.target ? null : refuse('notTheLastEvent', [newest.id]);
}
