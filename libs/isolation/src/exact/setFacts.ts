import { entropyBits, huffmanLength } from '../huffman';
import type { Steps } from '../steps';
import { bitsOf, type Masks } from './masks';

/** What a set of cells in question is made of. */
export interface SetFacts {
  weight: number;
  /** Points with cells of the set on both sides. */
  useful: number[];
  /** The shortest walk to a useful point. */
  nearest: number;
}

/** What telling the cells of a set apart takes at least, whatever is open. Weighted by probability. */
export interface SetBounds {
  /** Seconds of the readings, overloads included. */
  readings: number;
  /** Number of readings. */
  count: number;
  /** Seconds of walking beyond `nearest` when nothing is open. */
  far: number;
}

/** Facts about sets of cells, each worked out once. O(cells log cells) for a set. */
export class SetBook {
  private readonly facts = new Map<number, SetFacts>();
  private readonly bounds = new Map<number, SetBounds>();
  private readonly openings = new Map<number, number>();
  /** Room for `farWalks`. */
  private readonly farthest: Float64Array;

  constructor(
    readonly masks: Masks,
    private readonly steps: Steps,
  ) {
    this.farthest = new Float64Array(masks.cells.size);
  }

  of(set: number): SetFacts {
    const known = this.facts.get(set);
    if (known) return known;
    const facts = this.workOut(set);
    this.facts.set(set, facts);
    return facts;
  }

  boundsOf(set: number): SetBounds {
    const known = this.bounds.get(set);
    if (known) return known;
    const { weight, useful, nearest } = this.of(set);
    const { cells } = this.masks;
    const shares = bitsOf(set).map((v) => cells.weight[v] ?? 0);
    const count = huffmanLength(shares);
    const readings = this.readingSeconds(shares, weight, count);
    const bounds = { readings, count, far: this.farWalks(set, useful, nearest) };
    this.bounds.set(set, bounds);
    return bounds;
  }

  /**
   * Least weighted seconds of opening points, were power-ups and walks free and none of the set's points open yet: one
   * point at a time, tried at once, which then is exact. `open` names points that cost nothing more.
   */
  opening(set: number, open = 0): number {
    const { beyond } = this.masks;
    for (let rest = open; rest !== 0; rest &= rest - 1) {
      const within = set & (beyond[31 - Math.clz32(rest & -rest)] ?? 0);
      if (within === 0 || within === set) continue;
      return this.opening(within, open) + this.opening(set & ~within, open);
    }
    return this.openingClosed(set);
  }

  /**
   * While a cell is in question each of its leaves must be cut from it, which takes c seconds and removes p. Among such
   * cuts, and whatever lies between them, a greater p/c comes first in some best order (Smith 1956): so only the first
   * of the sisters left needs a look.
   */
  private openingClosed(set: number): number {
    if ((set & (set - 1)) === 0) return 0;
    const known = this.openings.get(set);
    if (known !== undefined) return known;
    const { beyond, cells, sistersBefore } = this.masks;
    const { weight, useful } = this.of(set);
    this.steps.spend(1);
    let least = Infinity;
    for (const v of useful) {
      const own = weight * (cells.hands[v] ?? 0);
      const isLater =
        (set & (sistersBefore[v] ?? 0)) !== 0 && (set & (1 << (cells.parent[v] ?? 0))) !== 0;
      if (own >= least || isLater) continue;
      const within = set & (beyond[v] ?? 0);
      const all = own + this.openingClosed(within) + this.openingClosed(set & ~within);
      if (all < least) least = all;
    }
    this.openings.set(set, least);
    return least;
  }

  private workOut(set: number): SetFacts {
    const { cells, beyond } = this.masks;
    let weight = 0;
    for (let rest = set; rest !== 0; rest &= rest - 1) {
      weight += cells.weight[31 - Math.clz32(rest & -rest)] ?? 0;
    }
    const useful: number[] = [];
    let nearest = Infinity;
    for (let v = 1; v < cells.size; v += 1) {
      const within = set & (beyond[v] ?? 0);
      if (within === 0 || within === set) continue;
      useful.push(v);
      nearest = Math.min(nearest, cells.walk[v] ?? 0);
    }
    return { weight, useful, nearest: useful.length === 0 ? 0 : nearest };
  }

  /** See `lowerBoundSeconds`: Huffman's number of readings, or the capacity of letters of unequal length. */
  private readingSeconds(shares: readonly number[], weight: number, count: number): number {
    const { powerSeconds, overloadSeconds, bitsPerSecond } = this.masks.cells;
    const counted = powerSeconds * count + overloadSeconds * (weight - Math.max(0, ...shares));
    if (overloadSeconds === 0) return counted;
    return Math.max(counted, (weight * entropyBits(shares)) / bitsPerSecond);
  }

  /** Points between neighbours are walked to twice, once to open and once to close. */
  private farWalks(set: number, useful: readonly number[], nearest: number): number {
    const { cells } = this.masks;
    const { farthest } = this;
    farthest.fill(nearest);
    for (const v of useful) {
      const up = cells.parent[v] ?? 0;
      if ((set & (1 << v)) === 0 || (set & (1 << up)) === 0) continue;
      const walk = cells.walk[v] ?? 0;
      farthest[v] = Math.max(farthest[v] ?? 0, walk);
      farthest[up] = Math.max(farthest[up] ?? 0, walk);
    }
    let seconds = 0;
    farthest.forEach((walk, v) => (seconds += 2 * (cells.weight[v] ?? 0) * (walk - nearest)));
    return seconds;
  }
}
