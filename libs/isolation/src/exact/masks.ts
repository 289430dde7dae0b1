import type { Cells } from '../cells';

/** More cells than this do not fit the numbers that stand for sets of cells and for states of the search. */
export const MOST_MASKED_CELLS = 20;

/**
 * The cells of a question as sets of bits: bit `v` stands for cell `v`, and in a set of points for the point above it.
 * Walks are counted in ranks, 0 for no walk, so that a state of the search is one number.
 */
export interface Masks {
  cells: Cells;
  /** All cells that may hold the short. */
  everything: number;
  /** By cell: the cells fed through it, itself included. */
  beyond: Int32Array;
  /**
   * By leaf: its sister leaves that hold more probability for each second of handling, the first of equal ones. As long
   * as readings are free and their parent is in question, each of them goes before it (see `SetBook.opening`).
   */
  sistersBefore: Int32Array;
  /** By point: the rank of its walk. */
  walkRank: Int32Array;
  /** By rank: the seconds of the walk, ascending. A point at the switch has a walk of 0 seconds, but a rank. */
  walkSeconds: number[];
}

/** All walks of a question by rank; see `Masks.walkSeconds`. O(cells log cells). */
export function walkSecondsOf({ walk, blockingWalk, spentWalk }: Cells): number[] {
  const walks = [...new Set([blockingWalk, spentWalk, ...walk.subarray(1)])].sort((a, b) => a - b);
  // Rank 0 is no walk at all; with power at hand no walk counts.
  return walks.some((seconds) => seconds > 0) ? [0, ...walks] : [0];
}

/** `walkSeconds` may hold more walks than those of the cells. O(cells^2). */
export function masksOf(cells: Cells, walkSeconds = walkSecondsOf(cells)): Masks {
  const { size, parent, weight, walk } = cells;
  const beyond = new Int32Array(size);
  let everything = 0;
  for (let v = size - 1; v >= 0; v -= 1) {
    const self = (weight[v] ?? 0) > 0 ? 1 << v : 0;
    everything |= self;
    beyond[v] = (beyond[v] ?? 0) | self;
    if (v > 0) {
      const up = parent[v] ?? 0;
      beyond[up] = (beyond[up] ?? 0) | (beyond[v] ?? 0);
    }
  }
  return {
    cells,
    everything,
    beyond,
    sistersBefore: sistersBefore(cells),
    walkRank: Int32Array.from(walk, (seconds) => Math.max(0, walkSeconds.lastIndexOf(seconds))),
    walkSeconds,
  };
}

/** The bits of a set, ascending. */
export function bitsOf(mask: number): number[] {
  const bits: number[] = [];
  for (let rest = mask; rest !== 0; rest &= rest - 1) bits.push(31 - Math.clz32(rest & -rest));
  return bits;
}

function sistersBefore({ size, parent, weight, hands }: Cells): Int32Array {
  const isLeaf = new Uint8Array(size).fill(1);
  for (let v = 1; v < size; v += 1) isLeaf[parent[v] ?? 0] = 0;
  // One number each, so that rounding cannot make the order go round in a circle.
  const worth = Float64Array.from(weight, (share, v) => (hands[v] ? share / hands[v] : Infinity));
  const before = new Int32Array(size);
  for (let v = 1; v < size; v += 1) {
    for (let other = 1; other < size; other += 1) {
      if (other === v || !isLeaf[v] || !isLeaf[other] || parent[v] !== parent[other]) continue;
      const [own, its] = [worth[v] ?? 0, worth[other] ?? 0];
      if (its > own || (its === own && other < v)) before[v] = (before[v] ?? 0) | (1 << other);
    }
  }
  return before;
}
