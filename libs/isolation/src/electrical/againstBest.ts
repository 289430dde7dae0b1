/**
 * How often a reading says nothing: a clamp on the wrong wire, a slip of the pen. What it denies keeps this share of what
 * fits best. Ours, no source.
 */
export const MISREAD = 0.01;

/**
 * Probabilities of a reading as a likelihood to reweigh a belief with: 1 where it fits best, `misread` where it does not
 * fit at all, and 1 everywhere if it fits nowhere, for then it says nothing.
 */
export function againstBest(fits: readonly number[], misread: number): number[] {
  const best = fits.reduce((most, fit) => Math.max(most, fit), 0);
  return fits.map((fit) => (best > 0 ? misread + (1 - misread) * (fit / best) : 1));
}
