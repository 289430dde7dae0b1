import type { PlaceRef } from '@lampwright/harness';
import { samePlace, type Situation, type TraceContext } from '@lampwright/trace';

export interface PlaceToInspect {
  ref: PlaceRef;
  probability: number;
  /** Looked at, and clear. */
  clear: boolean;
}

/** The places of the known section, or all that are in question while none is known; the likeliest first. */
export function placesToInspect(
  { known, placesInQuestion }: Situation,
  inspected: TraceContext['inspected'],
): PlaceToInspect[] {
  return placesInQuestion
    .filter(({ section }) => known === null || section === known)
    .map(({ ref, probability }) => ({
      ref,
      probability,
      clear: inspected.some(({ place }) => samePlace(place, ref)),
    }));
}
