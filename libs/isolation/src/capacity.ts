/**
 * The rate, in bits a second, at which readings of unequal length can tell things apart: the r that solves
 * 2^(-r short) + 2^(-r long) = 1 (capacity of a noiseless channel, Shannon 1948), by bisection. Infinite when a reading
 * takes no time.
 */
export function bitsPerSecond(short: number, long: number): number {
  if (short <= 0) return Infinity;
  let low = 0;
  let high = 1 / short;
  for (let round = 0; round < 60; round += 1) {
    const middle = (low + high) / 2;
    if (2 ** (-middle * short) + 2 ** (-middle * long) > 1) low = middle;
    else high = middle;
  }
  // The upper end, so that bounds made of it stay bounds.
  return high;
}
