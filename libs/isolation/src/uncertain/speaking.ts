import { energisedSections, type SectionTree } from '@lampwright/harness';
import type { Mended, Reading } from '../types';

/**
 * The readings that say anything of the shorts that are left. While a short that has since been mended was energised,
 * it alone decided how the power-up read, so those say nothing of the others, whether they overloaded or held. Those
 * with it parted off still count in full. O(readings x sections).
 */
export function speaking(
  tree: SectionTree,
  readings: readonly Reading[],
  mended: readonly Mended[],
): Reading[] {
  if (mended.length === 0) return [...readings];
  return readings.filter(({ open }, at) => {
    const since = mended.filter(({ after }) => at < after);
    if (since.length === 0) return true;
    const energised = energisedSections(tree, open);
    return !since.some(({ section }) => energised[section]);
  });
}
