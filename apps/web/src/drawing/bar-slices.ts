import type { SuspicionSlice } from './marks';

export interface LaidSlice extends SuspicionSlice {
  /** Where it starts and how much it covers, as shares of the whole bar. */
  start: number;
  share: number;
}

/** Lays slices side by side, the cleared ones first, each as wide as its probability. */
export function barSlices(slices: readonly SuspicionSlice[]): LaidSlice[] {
  const total = slices.reduce((sum, slice) => sum + slice.probability, 0);
  let start = 0;
  return [
    ...slices.filter((slice) => slice.state === 'cleared'),
    ...slices.filter((slice) => slice.state === 'inQuestion'),
  ].map((slice) => {
    const share = total > 0 ? slice.probability / total : 1 / slices.length;
    const laid = { ...slice, start, share };
    start += share;
    return laid;
  });
}
