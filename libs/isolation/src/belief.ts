import type { SectionTree } from '@lampwright/harness';
import { kindsOf, likelihood, type Kind } from './kinds';
import type { Belief, BeliefOptions, Reading } from './types';

/**
 * How much less likely one more short is, for each one beyond the first. Sections that are short independently of one
 * another, each with odds o, give sets of k shorts the weight o^k; 0.2 stands for 20 sections at 1 % each (ours).
 */
export const ANOTHER_SHORT_FACTOR = 0.2;

/** Above this many kinds of section, three shorts are looked at as two: the sum over triples would take too long. */
const MOST_KINDS_FOR_THREE = 150;

/**
 * Bayes' rule, exact, over every set of 1 to `maxFaults` sections. A set weighs the product of its sections'
 * probabilities, times `ANOTHER_SHORT_FACTOR` for each short beyond the first. An overload needs a short in the
 * energised part and then comes with probability `detection`, so with a short there the circuit still holds with
 * probability 1 - `detection`. Readings that no set explains are reported as `contradicted`, never thrown.
 *
 * Sections energised in the very same readings are of one kind and only kinds are enumerated, so ten thousand
 * sections are as easy as sixty: O(sections x readings + kinds^maxFaults x readings).
 */
export function believe(
  tree: SectionTree,
  readings: readonly Reading[],
  options: BeliefOptions = {},
): Belief {
  const { detection = 1, maxFaults = 1 } = options;
  const { kinds, kindOf } = kindsOf(tree, readings);
  const most = maxFaults > 2 && kinds.length > MOST_KINDS_FOR_THREE ? 2 : maxFaults;
  const weightOf = kinds.map((kind) =>
    setsWith(kind, kinds, most, (...set) => likelihood(set, readings, detection)),
  );

  let total = 0;
  const weights = tree.sections.map(({ index, probability }) => {
    const [one, two, three] = weightOf[kindOf[index] ?? 0]?.(probability) ?? [0, 0, 0];
    total += one + two / 2 + three / 3;
    return one + two + three;
  });
  if (!(total > 0)) {
    return { probabilities: weights.map(() => 0), inQuestion: [], contradicted: true };
  }
  const probabilities = weights.map((weight) => weight / total);
  return { probabilities, inQuestion: mostLikelyFirst(probabilities), contradicted: false };
}

/** Indices of the sections with a probability above 0, most likely first, equal ones in section order. */
function mostLikelyFirst(probabilities: readonly number[]): number[] {
  return [...probabilities.keys()]
    .filter((index) => (probabilities[index] ?? 0) > 0)
    .sort((a, b) => (probabilities[b] ?? 0) - (probabilities[a] ?? 0) || a - b);
}

type WeightBySize = [one: number, two: number, three: number];

/**
 * For a section of the given kind, as a function of its probability p: the weight of all sets of one, two and three
 * shorts that it is in. The other members of its own kind enter without it, through elementary symmetric sums.
 */
function setsWith(
  kind: Kind,
  kinds: readonly Kind[],
  most: number,
  likely: (...set: Kind[]) => number,
): (p: number) => WeightBySize {
  const alone = likely(kind);
  const others = most > 1 ? kinds.filter((other) => other !== kind) : [];
  const withOne = others.map((other) => likely(kind, other));
  let oneOther = 0;
  let twoOthers = 0;
  others.forEach((other, at) => {
    oneOther += other.sum * (withOne[at] ?? 0);
    if (most < 3) return;
    twoOthers += other.pairs * (withOne[at] ?? 0);
    for (const third of others.slice(at + 1)) {
      twoOthers += other.sum * third.sum * likely(kind, other, third);
    }
  });
  const second = most > 1 ? ANOTHER_SHORT_FACTOR : 0;
  const third = most > 2 ? ANOTHER_SHORT_FACTOR ** 2 : 0;
  return (p) => {
    // Counting members keeps rounding from inventing sets that a small kind does not have.
    const kin = kind.members > 1 ? kind.sum - p : 0;
    const kinPairs = kind.members > 2 ? kind.pairs - p * kin : 0;
    return [
      p * alone,
      second * p * (oneOther + kin * alone),
      third * p * (twoOthers + kin * oneOther + kinPairs * alone),
    ];
  };
}
