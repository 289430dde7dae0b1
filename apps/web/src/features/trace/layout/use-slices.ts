import { placeKey, type SectionTree } from '@lampwright/harness';
import { situation } from '@lampwright/trace';
import { useMemo } from 'react';
import type { SuspicionSlice } from '../../../drawing/marks';
import { useTraceContext } from '../store/trace-session';
import { useNames } from '../words/use-names';

export interface Slices {
  slices: SuspicionSlice[];
  inQuestion: number;
  cleared: number;
}

/**
 * The suspicion over the places of the circuit. A cleared place is as wide as it was before the first reading; those in
 * question share what is left by their probability.
 */
export function useSlices(): Slices {
  const now = useTraceContext(situation);
  const names = useNames();
  return useMemo(() => {
    if (!now) return { slices: [], inQuestion: 0, cleared: 0 };
    const prior = priorShares(now.tree);
    const cleared = now.placesCleared.map((ref): SuspicionSlice => {
      const key = placeKey(ref);
      return { key, label: names.place(ref), probability: prior.get(key) ?? 0, state: 'cleared' };
    });
    const left = 1 - cleared.reduce((sum, { probability }) => sum + probability, 0);
    const total = now.placesInQuestion.reduce((sum, { probability }) => sum + probability, 0);
    const inQuestion = now.placesInQuestion.map(({ ref, probability }): SuspicionSlice => ({
      key: placeKey(ref),
      label: names.place(ref),
      probability: (left * probability) / total,
      state: 'inQuestion',
    }));
    return {
      slices: [...cleared, ...inQuestion],
      inQuestion: inQuestion.length,
      cleared: cleared.length,
    };
  }, [now, names]);
}

/** By place: its share of all weight, before any reading. */
function priorShares({ sections }: SectionTree): Map<string, number> {
  const shares = new Map<string, number>();
  for (const { places, weight, probability } of sections) {
    for (const place of places) {
      const own = weight > 0 ? place.weight / weight : 1 / places.length;
      shares.set(placeKey(place.ref), probability * own);
    }
  }
  return shares;
}
