import { placeKey, type PartId } from '@lampwright/harness';
import { situation } from '@lampwright/trace';
import { useMemo } from 'react';
import type { DrawingMarks, PlaceMark } from '../../../drawing/marks';
import { useTraceContext } from '../store/trace-session';
import type { Overlay } from './overlay';

const NONE: readonly PartId[] = [];

/** What is known, as marks on the drawing. */
export function useMarks({ cut = NONE, lamps }: Overlay): DrawingMarks {
  const now = useTraceContext(situation);
  const open = useTraceContext((context) => context.open);
  const found = useTraceContext((context) => context.found);
  return useMemo(() => {
    const places = new Map<string, PlaceMark>();
    for (const ref of now?.placesCleared ?? []) places.set(placeKey(ref), 'cleared');
    for (const { ref } of now?.placesInQuestion ?? []) places.set(placeKey(ref), 'inQuestion');
    if (found) places.set(placeKey(found), 'found');
    return { cut, open, places, ...(lamps ? { lamps } : {}) };
  }, [now, open, found, cut, lamps]);
}
