import { placeOf, slopesOf, totalOf, type Term } from '../beliefTerms';
import { binaryEntropy, expectedBits } from './information';
import { targetOf } from './target';
import type { Standing } from './standing';

/** The rarest sets, which together weigh no more than this share, are left out where power-ups are only compared. */
const NEGLIGIBLE = 1e-9;

/** Probabilities nearer to 0 or 1 than this are rounding. */
const ROUNDING = 1e-10;

/** What a power-up is expected to show. */
export interface Outlook {
  /** Probability that a short is energised, if any is left. */
  lit: number;
  /** What the reading is expected to tell of the short that is hunted. */
  bits: number;
}

/** Probabilities of what power-ups show, for many power-ups of one standing. */
export class Odds {
  private readonly terms: Term[];
  private readonly total: number;
  private readonly dark: Float64Array;
  /** By section: how likely it is the short that is hunted. */
  private readonly target: number[];
  /** By section: the weight of the sets that it is in, for each unit of its probability. */
  private readonly weight: Float64Array;

  constructor(private readonly standing: Standing) {
    const { terms, sums } = standing.sets;
    this.terms = mainTerms(terms, sums);
    this.total = totalOf(this.terms, sums);
    this.dark = new Float64Array(sums.length);
    this.target = targetOf(standing).shares;
    this.weight = this.weights(sums, () => true);
  }

  /** The probability that a short is among the energised sections, if any is left. O(sections + terms). */
  lit(energised: readonly boolean[]): number {
    this.sumDark(energised);
    if (this.total === 0) return 0;
    return rounded(1 - totalOf(this.terms, this.dark) / this.total);
  }

  /** O(sections + terms). */
  outlook(energised: readonly boolean[]): Outlook {
    const { standing, target, weight } = this;
    const { detection, several } = standing;
    const lit = this.lit(energised);
    if (!several) return { lit, bits: expectedBits(lit, detection) };
    // With another short energised, a target that is parted off reads as if it were not.
    const alone = this.weights(this.dark, (index) => !energised[index]);
    let overload = 0;
    let noise = 0;
    for (const [index, share] of target.entries()) {
      if (share === 0) continue;
      const besides = energised[index]
        ? 1
        : rounded(1 - (alone[index] ?? 0) / (weight[index] ?? 1));
      overload += share * besides * detection;
      noise += share * binaryEntropy(besides * detection);
    }
    const bits = binaryEntropy(Math.min(1, overload)) - noise;
    return { lit, bits: bits < ROUNDING ? 0 : bits };
  }

  private sumDark(energised: readonly boolean[]): void {
    const { dark } = this;
    const { kindOf } = this.standing.sets;
    dark.fill(0);
    dark[0] = 1;
    for (const { index, probability } of this.standing.tree.sections) {
      if (energised[index] || probability === 0) continue;
      const at = 3 * (kindOf[index] ?? 0);
      const [one, two, three] = [dark[at + 1] ?? 0, dark[at + 2] ?? 0, dark[at + 3] ?? 0];
      dark[at + 3] = three + two * probability;
      dark[at + 2] = two + one * probability;
      dark[at + 1] = one + probability;
    }
  }

  private weights(sums: Float64Array, of: (section: number) => boolean): Float64Array {
    const { sets, tree } = this.standing;
    const slopes = slopesOf(this.terms, sums);
    const weights = new Float64Array(tree.sections.length);
    for (const { index, probability } of tree.sections) {
      if (probability === 0 || !of(index)) continue;
      const kind = sets.kindOf[index] ?? 0;
      const kin = Math.max(0, (sums[placeOf(kind, 1)] ?? 0) - probability);
      const pairs = Math.max(0, (sums[placeOf(kind, 2)] ?? 0) - probability * kin);
      weights[index] =
        (slopes[placeOf(kind, 1)] ?? 0) +
        kin * (slopes[placeOf(kind, 2)] ?? 0) +
        pairs * (slopes[placeOf(kind, 3)] ?? 0);
    }
    return weights;
  }
}

function rounded(probability: number): number {
  if (probability < ROUNDING) return 0;
  return probability > 1 - ROUNDING ? 1 : probability;
}

/** The terms but for the smallest ones. O(terms log terms). */
function mainTerms(terms: readonly Term[], sums: Float64Array): Term[] {
  const weighed = terms.map((term) => ({ term, weight: totalOf([term], sums) }));
  weighed.sort((a, b) => b.weight - a.weight);
  let left = NEGLIGIBLE * weighed.reduce((sum, { weight }) => sum + weight, 0);
  let end = weighed.length;
  for (; end > 1; end -= 1) {
    left -= weighed[end - 1]?.weight ?? 0;
    if (left < 0) break;
  }
  return weighed.slice(0, end).map(({ term }) => term);
}
