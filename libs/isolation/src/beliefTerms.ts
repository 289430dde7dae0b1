import type { Kind } from './kinds';
import type { Reading } from './types';

/**
 * The sets of one, two or three shorts whose members are of certain kinds. All of them explain the readings equally
 * well, so together they weigh `factor` times three sums of products, each given by its place in `sumsOf`.
 */
export interface Term {
  x: number;
  y: number;
  z: number;
  /** Probability of the readings, times what one more short is less likely. Above 0. */
  factor: number;
}

/** How the sets are weighed. */
export interface TermOptions {
  detection: number;
  maxFaults: number;
  /** How much less likely one more short is. */
  another: number;
}

/** Where the sum of single, double and triple products of a kind stands. */
export const placeOf = (kind: number, power: 1 | 2 | 3): number => 3 * kind + power;

/** By `placeOf`: the sums of products of each kind; 1 in place 0, for what a set does not have. */
export function sumsOf(kinds: readonly Kind[]): Float64Array {
  return Float64Array.from([
    1,
    ...kinds.flatMap(({ sum, pairs, triples }) => [sum, pairs, triples]),
  ]);
}

/** The terms that the readings leave possible. O(kinds^maxFaults x readings). */
export function termsOf(
  kinds: readonly Kind[],
  readings: readonly Reading[],
  { detection, maxFaults, another }: TermOptions,
): Term[] {
  const overloads = readings.map(({ outcome }) => outcome === 'overload');
  const likely = (lit: readonly boolean[]): number => {
    let product = 1;
    for (let at = 0; at < overloads.length; at += 1) {
      const shown = lit[at] ? detection : 0;
      product *= overloads[at] ? shown : 1 - shown;
      if (product === 0) return 0;
    }
    return product;
  };
  const terms: Term[] = [];
  const add = (places: [number, number, number], likelihood: number, shorts: number) => {
    if (likelihood === 0) return;
    const [x, y, z] = places;
    terms.push({ x, y, z, factor: likelihood * another ** (shorts - 1) });
  };
  kinds.forEach((one, a) => {
    const alone = likely(one.energised);
    add([placeOf(a, 1), 0, 0], alone, 1);
    if (maxFaults > 1) add([placeOf(a, 2), 0, 0], alone, 2);
    if (maxFaults > 2) add([placeOf(a, 3), 0, 0], alone, 3);
    for (let b = a + 1; maxFaults > 1 && b < kinds.length; b += 1) {
      const both = union(one.energised, kinds[b]?.energised ?? []);
      const two = likely(both);
      add([placeOf(a, 1), placeOf(b, 1), 0], two, 2);
      if (maxFaults < 3) continue;
      add([placeOf(a, 2), placeOf(b, 1), 0], two, 3);
      add([placeOf(a, 1), placeOf(b, 2), 0], two, 3);
      for (let c = b + 1; c < kinds.length; c += 1) {
        const three = likely(union(both, kinds[c]?.energised ?? []));
        add([placeOf(a, 1), placeOf(b, 1), placeOf(c, 1)], three, 3);
      }
    }
  });
  return terms;
}

/** The weight of all sets together. O(terms). */
export function totalOf(terms: readonly Term[], sums: Float64Array): number {
  let total = 0;
  for (const { x, y, z, factor } of terms) {
    total += factor * (sums[x] ?? 0) * (sums[y] ?? 0) * (sums[z] ?? 0);
  }
  return total;
}

/** By `placeOf`: what the weight of all sets gains for each unit that a sum gains. O(terms). */
export function slopesOf(terms: readonly Term[], sums: Float64Array): Float64Array {
  const slopes = new Float64Array(sums.length);
  for (const { x, y, z, factor } of terms) {
    const [ofX, ofY, ofZ] = [sums[x] ?? 0, sums[y] ?? 0, sums[z] ?? 0];
    slopes[x] = (slopes[x] ?? 0) + factor * ofY * ofZ;
    slopes[y] = (slopes[y] ?? 0) + factor * ofX * ofZ;
    slopes[z] = (slopes[z] ?? 0) + factor * ofX * ofY;
  }
  return slopes;
}

function union(a: readonly boolean[], b: readonly boolean[]): boolean[] {
  return a.map((lit, at) => lit || b[at] === true);
}
