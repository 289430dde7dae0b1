import { energisedSections, type SectionTree } from '@lampwright/harness';
import type { Belief, Reading } from '@lampwright/isolation';

/**
 * The probabilities that a planner of one short is asked about, summing to 1. Where several shorts may be there at once
 * the hunt is for one of them: within what was energised at the latest overload, which surely holds one. A planner
 * then never asks for that same state again. O(sections × readings).
 */
export function focus(
  tree: SectionTree,
  belief: Belief,
  readings: readonly Reading[],
  maxFaults: number,
): number[] {
  const { probabilities } = belief;
  const latest = readings.findLast(({ outcome }) => outcome === 'overload');
  if (maxFaults === 1 || !latest) return shared(probabilities);
  const energised = energisedSections(tree, latest.open);
  const within = probabilities.map((probability, index) => (energised[index] ? probability : 0));
  // A point barred since then can join what was energised to what was not.
  return shared(within.some((probability) => probability > 0) ? within : probabilities);
}

function shared(weights: readonly number[]): number[] {
  const sum = weights.reduce((total, weight) => total + weight, 0);
  return weights.map((weight) => weight / sum);
}
