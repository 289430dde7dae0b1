import type { SectionTree } from '@lampwright/harness';
import { placeOf, slopesOf, sumsOf, termsOf, totalOf, type Term } from './beliefTerms';
import { kindsOf, type Kind } from './kinds';
import type { Belief, BeliefOptions, Reading } from './types';

/**
 * How much less likely one more short is, for each one beyond the first. Sections that are short independently of one
 * another, each with odds o, give sets of k shorts the weight o^k; 0.2 stands for 20 sections at 1 % each (ours).
 */
export const ANOTHER_SHORT_FACTOR = 0.2;

/** Above this many kinds of section, three shorts are looked at as two: the sum over triples would take too long. */
const MOST_KINDS_FOR_THREE = 150;

/** Every set of shorts with its weight, sorted by the kinds of its members. */
export interface WeighedSets {
  kinds: Kind[];
  /** By section index. */
  kindOf: number[];
  terms: Term[];
  /** See `sumsOf`. */
  sums: Float64Array;
  /** The weight of all sets together; 0 when none explains the readings. */
  total: number;
}

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
  const sets = weighSets(tree, readings, options);
  const { total } = sets;
  if (!(total > 0)) {
    const probabilities = tree.sections.map(() => 0);
    return { probabilities, inQuestion: [], contradicted: true };
  }
  const probabilities = shareOfEach(tree, sets);
  return { probabilities, inQuestion: mostLikelyFirst(probabilities), contradicted: false };
}

/** Weighs every set of shorts by the readings, as `believe` does. */
export function weighSets(
  tree: SectionTree,
  readings: readonly Reading[],
  { detection = 1, maxFaults = 1 }: BeliefOptions,
): WeighedSets {
  const { kinds, kindOf } = kindsOf(tree, readings);
  const most = maxFaults > 2 && kinds.length > MOST_KINDS_FOR_THREE ? 2 : maxFaults;
  const terms = termsOf(kinds, readings, {
    detection,
    maxFaults: most,
    another: ANOTHER_SHORT_FACTOR,
  });
  const sums = sumsOf(kinds);
  return { kinds, kindOf, terms, sums, total: totalOf(terms, sums) };
}

/** By section: the weight of the sets that it is in, as a share of all. The others of its kind enter without it. */
function shareOfEach(tree: SectionTree, { kinds, kindOf, terms, sums, total }: WeighedSets) {
  const slopes = slopesOf(terms, sums);
  return tree.sections.map(({ index, probability: p }) => {
    const at = kindOf[index] ?? 0;
    const kind = kinds[at];
    if (!kind || p === 0) return 0;
    // Counting members keeps rounding from inventing sets that a small kind does not have.
    const kin = kind.members > 1 ? kind.sum - p : 0;
    const kinPairs = kind.members > 2 ? Math.max(0, kind.pairs - p * kin) : 0;
    const weight =
      (slopes[placeOf(at, 1)] ?? 0) +
      kin * (slopes[placeOf(at, 2)] ?? 0) +
      kinPairs * (slopes[placeOf(at, 3)] ?? 0);
    return Math.min(1, (p * weight) / total);
  });
}

/** Indices of the sections with a probability above 0, most likely first, equal ones in section order. */
function mostLikelyFirst(probabilities: readonly number[]): number[] {
  return [...probabilities.keys()]
    .filter((index) => (probabilities[index] ?? 0) > 0)
    .sort((a, b) => (probabilities[b] ?? 0) - (probabilities[a] ?? 0) || a - b);
}
