/**
 * Bits expected from one power-up, when a short is energised with probability `lit` and shows with probability
 * `detection` (mutual information of a Z-channel): h(lit d) - lit h(d). 0 for a `lit` of 0 or 1.
 */
export function expectedBits(lit: number, detection: number): number {
  return Math.max(0, binaryEntropy(lit * detection) - lit * binaryEntropy(detection));
}

/**
 * The most bits that one power-up can tell, whatever is energised (capacity of a Z-channel with miss probability
 * e = 1 - detection): log2(1 + (1 - e) e^(e / (1 - e))). 1 for a short that always shows.
 */
export function mostBits(detection: number): number {
  const miss = 1 - detection;
  return Math.log2(1 + detection * miss ** (miss / detection));
}

/** Entropy in bits of an event with this probability; 0 at the ends. */
export function binaryEntropy(probability: number): number {
  return bits(probability) + bits(1 - probability);
}

function bits(share: number): number {
  return share > 0 ? -share * Math.log2(share) : 0;
}
