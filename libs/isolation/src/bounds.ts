import { bitsPerSecond } from './capacity';
import type { Cells } from './cells';
import { entropyBits, huffmanLength } from './huffman';

/**
 * Expected seconds that no order of work can beat, from the start of a question to everything closed again. Adds money
 * that can be counted apart: readings, first openings, walks and what is open already. O(cells log cells).
 */
export function lowerBoundSeconds(cells: Cells): number {
  const started = cells.open.length > 0 || cells.blocking.length > 0;
  const nearest = nearestWalk(cells);
  const readings = readingSeconds(cells, cells.powerSeconds + nearest);
  // The closing is one more walk; with points open at the start the first power-up may touch nothing.
  const closingWalk = started ? 0 : nearest;
  return cells.closing + readings + closingWalk + openingSeconds(cells, nearest);
}

/** The shortest walk that a power-up can need: each one but perhaps the first must touch a useful point. */
function nearestWalk({ walk, size, blocking, blockingWalk }: Cells): number {
  let nearest = blocking.length > 0 ? blockingWalk : Infinity;
  for (let v = 1; v < size; v += 1) nearest = Math.min(nearest, walk[v] ?? 0);
  return Number.isFinite(nearest) ? nearest : 0;
}

/**
 * Seconds of the readings alone. Their number is at least Huffman's, and all cells but one end with an overload; or
 * else, where an overload is dear, by the capacity of a channel whose two letters take unequal time (Shannon 1948):
 * entropy over the rate r that solves 2^(-r holds) + 2^(-r overload) = 1.
 */
function readingSeconds({ weight, overloadSeconds }: Cells, each: number): number {
  const likeliest = weight.reduce((most, share) => Math.max(most, share), 0);
  const counted = each * huffmanLength(weight) + overloadSeconds * (1 - likeliest);
  if (overloadSeconds === 0) return counted;
  return Math.max(counted, entropyBits(weight) / bitsPerSecond(each, each + overloadSeconds));
}

/**
 * Only the point between two neighbouring cells tells them apart, so it is opened whenever the short is in either; and
 * it is walked to once to open it and another time to close it.
 */
function openingSeconds(
  { size, parent, weight, hands, walk, open }: Cells,
  nearest: number,
): number {
  const isOpen = new Set(open);
  const farthest = new Float64Array(size);
  let seconds = 0;
  for (let v = 1; v < size; v += 1) {
    const up = parent[v] ?? 0;
    const here = weight[v] ?? 0;
    const there = weight[up] ?? 0;
    if (here === 0 || there === 0 || isOpen.has(v)) continue;
    seconds += (hands[v] ?? 0) * (here + there);
    farthest[v] = Math.max(farthest[v] ?? 0, walk[v] ?? 0);
    farthest[up] = Math.max(farthest[up] ?? 0, walk[v] ?? 0);
  }
  farthest.forEach((far, v) => {
    if (far > nearest) seconds += 2 * (weight[v] ?? 0) * (far - nearest);
  });
  return seconds;
}
