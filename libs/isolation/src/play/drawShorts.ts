import type { SectionTree } from '@lampwright/harness';
import { ANOTHER_SHORT_FACTOR } from '../belief';

/**
 * Draws `count` different sections, each set of them as often as the product of its sections' probabilities says. Fewer
 * where fewer can be short. Redraws equal ones, so O(sections x draws).
 */
export function drawShorts(tree: SectionTree, count: number, random: () => number): number[] {
  const able = tree.sections.filter(({ probability }) => probability > 0);
  if (count >= able.length) return able.map(({ index }) => index);
  for (;;) {
    const drawn = new Set(Array.from({ length: count }, () => drawOne(able, random)));
    if (drawn.size === count) return [...drawn];
  }
}

/** How likely one, two, ... `most` shorts are, by the same rule as the belief's. O(sections). */
export function shareOfCounts(tree: SectionTree, most: number): number[] {
  // Sums of products of one, two, three different probabilities.
  const sums = Array.from({ length: most + 1 }, (_, power) => (power === 0 ? 1 : 0) as number);
  for (const { probability } of tree.sections) {
    for (let power = most; power > 0; power -= 1) {
      sums[power] = (sums[power] ?? 0) + (sums[power - 1] ?? 0) * probability;
    }
  }
  const weights = sums.slice(1).map((sum, more) => sum * ANOTHER_SHORT_FACTOR ** more);
  const total = weights.reduce((sum, weight) => sum + weight, 0);
  return weights.map((weight) => weight / total);
}

function drawOne(sections: SectionTree['sections'], random: () => number): number {
  const total = sections.reduce((sum, { probability }) => sum + probability, 0);
  let left = random() * total;
  for (const { index, probability } of sections) {
    left -= probability;
    if (left < 0) return index;
  }
  return sections.at(-1)?.index ?? 0;
}
