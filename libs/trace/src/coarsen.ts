import type { SectionTree } from '@lampwright/harness';
import type { Belief } from '@lampwright/isolation';

/**
 * A belief over the sections of `fine`, told over the sections of `coarse`, whose points are a subset: a coarse section
 * holds a short when any of its parts does. Takes the shorts of different sections as exclusive, as they are with one
 * short, and never says more than 1. O(places).
 */
export function coarsen(belief: Belief, fine: SectionTree, coarse: SectionTree): Belief {
  const home = homes(fine, coarse);
  const probabilities = coarse.sections.map(() => 0);
  fine.sections.forEach(({ index }) => {
    const to = home[index] ?? 0;
    const sum = (probabilities[to] ?? 0) + (belief.probabilities[index] ?? 0);
    probabilities[to] = Math.min(1, sum);
  });
  return { probabilities, inQuestion: ranked(probabilities), contradicted: belief.contradicted };
}

/** By fine section: the coarse section that it is part of. */
function homes(fine: SectionTree, coarse: SectionTree): number[] {
  const bySection = new Map<string | undefined, number>();
  coarse.sections.forEach(({ point, index }) => bySection.set(point?.partId, index));
  const home: number[] = [];
  for (const { point, parent } of fine.sections) {
    const own = parent === null ? 0 : bySection.get(point?.partId);
    home.push(own ?? home[parent ?? 0] ?? 0);
  }
  return home;
}

function ranked(probabilities: readonly number[]): number[] {
  return probabilities
    .map((probability, index) => ({ probability, index }))
    .filter(({ probability }) => probability > 0)
    .sort((a, b) => b.probability - a.probability || a.index - b.index)
    .map(({ index }) => index);
}
