import { placeKey, type Part, type Run } from '@lampwright/harness';
import type { DrawingMarks, PlaceMark } from './marks';

/** A plug that can be opened is two places; anything else is one. */
export interface PartMarks {
  feed: PlaceMark;
  load: PlaceMark;
  /** The one that matters more. */
  whole: PlaceMark;
}

const WEIGHT: Record<PlaceMark, number> = { idle: 0, cleared: 1, inQuestion: 2, found: 3 };

export function partMarks(part: Part, places: DrawingMarks['places']): PartMarks {
  const whole = places.get(placeKey({ kind: 'part', id: part.id }));
  const half = (side: 'feed' | 'load') =>
    places.get(placeKey({ kind: 'part', id: part.id, half: side })) ?? whole ?? 'idle';
  const feed = half('feed');
  const load = half('load');
  const heavier = WEIGHT[feed] > WEIGHT[load] ? feed : load;
  return { feed, load, whole: whole ?? heavier };
}

export function runMark(run: Run, places: DrawingMarks['places']): PlaceMark {
  return places.get(placeKey({ kind: 'run', id: run.id })) ?? 'idle';
}
