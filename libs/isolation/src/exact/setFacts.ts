import { entropyBits, huffmanLength } from '../huffman';
import type { Steps } from '../steps';
import { bitsOf, type Masks } from './masks';

/** What can be said of a set of cells in question whatever is open. All seconds are weighted by probability. */
export interface SetFacts {
  weight: number;
  /** Least seconds of the readings, overloads included. */
  readings: number;
  /** Least number of readings, weighted. */
  count: number;
  /** Points with cells of the set on both sides. */
  useful: number[];
  usefulMask: number;
  /** The shortest walk to a useful point. */
  nearest: number;
  /** Least seconds of walking beyond `nearest` when nothing is open. */
  far: number;
}

/** Facts about sets of cells, each worked out once. */
export class SetBook {
  private readonly facts = new Map<number, SetFacts>();
  private readonly openings = new Map<number, number>();
  constructor(
    readonly masks: Masks,
    private readonly steps: Steps,
  ) {}

  of(set: number): SetFacts {
    const known = this.facts.get(set);
    if (known) return known;
    const facts = this.workOut(set);
    this.facts.set(set, facts);
    return facts;
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
    const shares = bitsOf(set).map((v) => cells.weight[v] ?? 0);
    const weight = shares.reduce((sum, share) => sum + share, 0);
    const useful: number[] = [];
    let usefulMask = 0;
    let nearest = Infinity;
    for (let v = 1; v < cells.size; v += 1) {
      const within = set & (beyond[v] ?? 0);
      if (within === 0 || within === set) continue;
      useful.push(v);
      usefulMask |= 1 << v;
      nearest = Math.min(nearest, cells.walk[v] ?? 0);
    }
    if (useful.length === 0) nearest = 0;
    const count = huffmanLength(shares);
    return {
      weight,
      readings: this.readingSeconds(shares, weight, count),
      count,
      useful,
      usefulMask,
      nearest,
      far: this.farWalks(set, useful, nearest),
    };
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
    const farthest = new Map<number, number>();
    for (const v of useful) {
      const up = cells.parent[v] ?? 0;
      if ((set & (1 << v)) === 0 || (set & (1 << up)) === 0) continue;
      const walk = cells.walk[v] ?? 0;
      for (const end of [v, up]) farthest.set(end, Math.max(farthest.get(end) ?? 0, walk));
    }
    let seconds = 0;
    for (const [v, walk] of farthest) seconds += 2 * (cells.weight[v] ?? 0) * (walk - nearest);
    return seconds;
  }
}
