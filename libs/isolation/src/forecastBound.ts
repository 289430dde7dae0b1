import type { SectionTree } from '@lampwright/harness';
import { entropyBits } from './huffman';
import type { Timing } from './types';
import { binaryEntropy, mostBits } from './uncertain/information';
import { STOPS_AT } from './uncertain/standing';

/**
 * Expected seconds that no order of work can beat, by what power-ups can tell at most; handling is not counted.
 *
 * - Shorts that always show: all of them are known at the end, so the power-ups tell the entropy of the set, and each
 *   tells at most one bit (Shannon 1948).
 * - One short that may be missed: named with an error of 5 % at most, it leaves at most h(0.05) + 0.05 log2(n - 1) bits
 *   open (Fano 1961), and each power-up tells at most the capacity of a Z-channel.
 * - Several that may be missed: at least the power-up that proves the repair.
 *
 * O(sections).
 */
export function huntBoundSeconds(
  tree: SectionTree,
  { powerSeconds }: Timing,
  { faults, detection }: { faults: number; detection: number },
): number {
  const weights = tree.sections.flatMap(({ probability }) =>
    probability > 0 ? [probability] : [],
  );
  if (detection === 1) return powerSeconds * entropyOfSets(weights, faults);
  if (faults > 1) return powerSeconds;
  const wrong = 1 - STOPS_AT;
  const open = binaryEntropy(wrong) + wrong * Math.log2(Math.max(1, weights.length - 1));
  return powerSeconds * Math.max(0, (entropyBits(weights) - open) / mostBits(detection));
}

/**
 * Bits in a set of `size` different sections, drawn by the product of its members' weights. With e_k the sum of all
 * products of k weights: H = log2 e_k - (sum over sections of w log2 w times the sum of products of k - 1 others) / e_k.
 */
function entropyOfSets(weights: readonly number[], size: number): number {
  const count = Math.min(size, weights.length);
  const all = productSums(weights, count);
  const whole = all[count] ?? 0;
  let inside = 0;
  for (const weight of weights) {
    // Sums of products without this weight, taken back out of the sums of all.
    let without = 1;
    for (let power = 1; power < count; power += 1) without = (all[power] ?? 0) - weight * without;
    inside += weight * Math.log2(weight) * without;
  }
  return Math.max(0, Math.log2(whole) - inside / whole);
}

function productSums(weights: readonly number[], most: number): number[] {
  const sums = Array.from({ length: most + 1 }, (_, power) => (power === 0 ? 1 : 0) as number);
  for (const weight of weights) {
    for (let power = most; power > 0; power -= 1) {
      sums[power] = (sums[power] ?? 0) + weight * (sums[power - 1] ?? 0);
    }
  }
  return sums;
}
