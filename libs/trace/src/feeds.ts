import type { Feed, FeedKind } from './feed';
import type { Seen } from './events';
import type { TraceContext } from './state';

const HARD: readonly FeedKind[] = ['breaker', 'fuse'];

/** Whether an overload on this feed is a hard trip: nothing but the protection limits the current. */
export function tripsHard(feed: Feed | null): boolean {
  return feed !== null && HARD.includes(feed.kind);
}

/** Whether what was seen is an overload; one that flickers counts as one. */
export function isOverload(seen: Seen | 'dark' | null | undefined): boolean {
  return seen === 'overload' || seen === 'flickers';
}

/** Hard trips since the last cool-down, once `seen` is counted. */
export function tripsAfter(context: TraceContext, seen: Seen | 'dark'): number {
  return context.overloads + (isOverload(seen) && tripsHard(context.feed) ? 1 : 0);
}

/** Whether the shop's limit of hard trips is reached on a feed that does not limit the current. */
export function coolDownDue(context: TraceContext): boolean {
  return tripsHard(context.feed) && context.overloads >= context.record.settings.overloadLimit;
}
