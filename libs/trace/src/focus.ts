import { energisedSections, type SectionTree } from '@lampwright/harness';
import type { Belief, Reading } from '@lampwright/isolation';
import type { TraceContext } from './state';

/**
 * The probabilities that a planner of one short is asked about, summing to 1. Where several shorts may be there at once
 * the hunt is for one of them: within the smallest energised part that overloaded, which surely holds one.
 * O(sections × readings).
 */
export function focus(
  context: TraceContext,
  tree: SectionTree,
  belief: Belief,
  readings: readonly Reading[],
): number[] {
  const { probabilities } = belief;
  const within = context.maxFaults > 1 ? smallestOverload(tree, probabilities, readings) : null;
  const kept = probabilities.map((probability, index) =>
    !within || within[index] ? probability : 0,
  );
  const sum = kept.reduce((total, probability) => total + probability, 0);
  return kept.map((probability) => probability / sum);
}

function smallestOverload(
  tree: SectionTree,
  probabilities: readonly number[],
  readings: readonly Reading[],
): boolean[] | null {
  let smallest: boolean[] | null = null;
  let least = Infinity;
  for (const { open, outcome } of readings) {
    if (outcome !== 'overload') continue;
    const energised = energisedSections(tree, open);
    const inQuestion = energised.filter((on, index) => on && (probabilities[index] ?? 0) > 0);
    if (inQuestion.length > 0 && inQuestion.length < least) {
      least = inQuestion.length;
      smallest = energised;
    }
  }
  return smallest;
}
