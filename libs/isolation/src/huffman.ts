/**
 * Length of the best yes-no identification: the sum over the weights of weight times number of readings, whatever sets
 * the readings ask about (Huffman 1952). Weights need not sum to 1; zeros count for nothing. O(n log n).
 */
export function huffmanLength(weights: Iterable<number>): number {
  const leaves = [...weights].filter((weight) => weight > 0).sort((a, b) => a - b);
  const merged: number[] = [];
  let leaf = 0;
  let inner = 0;
  const least = () => {
    const fresh = leaves[leaf] ?? Infinity;
    const old = merged[inner] ?? Infinity;
    if (fresh <= old) leaf += 1;
    else inner += 1;
    return Math.min(fresh, old);
  };
  let length = 0;
  for (let joins = leaves.length - 1; joins > 0; joins -= 1) {
    const pair = least() + least();
    merged.push(pair);
    length += pair;
  }
  return length;
}

/** Entropy of the weights after division by their sum, in bits. O(n). */
export function entropyBits(weights: Iterable<number>): number {
  const positive = [...weights].filter((weight) => weight > 0);
  const sum = positive.reduce((total, weight) => total + weight, 0);
  return positive.reduce((bits, weight) => bits - (weight / sum) * Math.log2(weight / sum), 0);
}
