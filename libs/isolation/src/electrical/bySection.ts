import type { PlaceRef, SectionTree } from '@lampwright/harness';
import type { Spot } from './wiring';

/** Where a run is looked at to stand for all of it. */
const FRACTIONS = [1 / 6, 1 / 2, 5 / 6];

/**
 * By section index: the mean of a figure over the section's places, by their weights. A run counts as the mean of three
 * spots along it. A section without weight takes its places alike; one without places gives 0. O(places).
 */
export function bySection(tree: SectionTree, figure: (spot: Spot) => number): number[] {
  return tree.sections.map(({ places }) => {
    // Against the largest, so that neither tiny nor enormous weights are lost in the arithmetic.
    const largest = places.reduce((most, { weight }) => Math.max(most, weight), 0);
    let sum = 0;
    let weights = 0;
    for (const { ref, weight } of places) {
      const share = largest > 0 ? weight / largest : 1;
      if (share === 0) continue;
      const spots = spotsOf(ref);
      sum += (share * spots.reduce((total, spot) => total + figure(spot), 0)) / spots.length;
      weights += share;
    }
    return weights > 0 ? sum / weights : 0;
  });
}

function spotsOf(place: PlaceRef): Spot[] {
  return place.kind === 'run' ? FRACTIONS.map((fraction) => ({ place, fraction })) : [{ place }];
}
