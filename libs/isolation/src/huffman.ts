/**
 * Length of the best yes-no identification: the sum over the weights of weight times number of readings, whatever sets
 * the readings ask about (Huffman 1952). Weights need not sum to 1; zeros count for nothing. O(n log n).
 */
export function huffmanLength(weights: Iterable<number>): number {
  const leaves: number[] = [];
  for (const weight of weights) if (weight > 0) leaves.push(weight);
  leaves.sort((a, b) => a - b);
  // Joined weights come out in ascending order, so two queues do instead of a heap (van Leeuwen 1976).
  const merged: number[] = [];
  let leaf = 0;
  let inner = 0;
  let length = 0;
  for (let joins = leaves.length - 1; joins > 0; joins -= 1) {
    let pair = 0;
    for (let taken = 0; taken < 2; taken += 1) {
      const fresh = leaves[leaf] ?? Infinity;
      const old = merged[inner] ?? Infinity;
      if (fresh <= old) leaf += 1;
      else inner += 1;
      pair += Math.min(fresh, old);
    }
    merged.push(pair);
    length += pair;
  }
  return length;
}

/** Entropy of the weights after division by their sum, in bits. O(n). */
export function entropyBits(weights: Iterable<number>): number {
  const all = [...weights];
  const sum = all.reduce((total, weight) => total + weight, 0);
  // A weight far below the others may be no share at all once it is rounded.
  return all.reduce((bits, weight) => {
    const share = weight / sum;
    return share > 0 ? bits - share * Math.log2(share) : bits;
  }, 0);
}
