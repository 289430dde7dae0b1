import type { Length } from '../playOut';
import type { Steps } from '../steps';
import { MoveList, type Move } from './moves';
import type { Masks } from './masks';
import { SetBook } from './setFacts';
import { keyOf, settle, type State } from './state';

/** The best first move, with the length of the best play. */
export interface Best {
  move: Move;
  length: Length;
}

/** What is known of a state: the length of its best play, or weighted seconds that it takes at least. */
type Known = { length: Length } | { least: number };

/**
 * Finds the least expected seconds of all plays: any points opened or closed at any time, early ones included. Depth
 * first with a limit, and with what was found of a state kept: either its value or what it takes at least. Moves are
 * tried in the order of what they promise at least, and the rest is left as soon as one cannot beat the best.
 */
export class ExactSearch {
  private readonly book: SetBook;
  private readonly known = new Map<number, Known>();

  constructor(
    private readonly masks: Masks,
    private readonly steps: Steps,
  ) {
    this.book = new SetBook(masks, steps);
  }

  /**
   * The best play of fewer than `limit` weighted seconds that begins with an allowed move, or `null` when there is none.
   *
   * @throws StepsSpent when the steps do not suffice.
   */
  best(state: State, limit: number, allows: (move: Move) => boolean = () => true): Best | null {
    let best: Best | null = null;
    let bound = limit;
    for (const option of this.options(state, limit)) {
      if (option.least >= bound) break;
      if (!allows(option.move)) continue;
      const length = this.lengthOf(option, bound);
      if (!length) continue;
      best = { move: option.move, length };
      bound = length.weighted;
    }
    return best;
  }

  /** The length of the best play from a state when it takes fewer than `limit` weighted seconds, otherwise `null`. */
  length(state: State, limit: number): Length | null {
    const { weight, useful } = this.book.of(state.set);
    if (useful.length === 0) {
      const walk = this.lastWalk(state);
      return { weighted: weight * walk, worst: walk };
    }
    const key = keyOf(this.masks, state);
    const before = this.known.get(key);
    if (before && 'length' in before) return before.length;
    if (before && before.least >= limit) return null;
    const length = this.best(state, limit)?.length ?? null;
    this.known.set(key, length ? { length } : { least: limit });
    return length;
  }

  private lengthOf(option: Option, bound: number): Length | null {
    const { move, onOverload, onHolds, leastHolds } = option;
    const overload = this.length(onOverload, bound - move.cost - leastHolds);
    if (!overload) return null;
    const holds = this.length(onHolds, bound - move.cost - overload.weighted);
    if (!holds) return null;
    const weighted = move.cost + overload.weighted + holds.weighted;
    if (weighted >= bound) return null;
    const { overloadSeconds } = this.masks.cells;
    const worst = move.seconds + Math.max(overloadSeconds + overload.worst, holds.worst);
    return { weighted, worst };
  }

  private options(state: State, limit: number): Option[] {
    const options: Option[] = [];
    for (const move of new MoveList(this.book, state, limit, this.steps).list()) {
      const spent = state.spent > move.walk ? state.spent : 0;
      const onOverload = settle(this.masks, move.energised, move.open, spent);
      const onHolds = settle(this.masks, state.set & ~move.energised, move.open, spent);
      const leastHolds = this.least(onHolds);
      const least = move.cost + this.least(onOverload) + leastHolds;
      if (least < limit) options.push({ move, onOverload, onHolds, leastHolds, least });
    }
    return options.sort((a, b) => a.least - b.least);
  }

  /** A bound below the weighted seconds of a state that a reading left. */
  private least(state: State): number {
    const { set, open, forced, spent } = state;
    const { weight, useful, nearest } = this.book.of(set);
    if (useful.length === 0) return weight * this.lastWalk(state);
    const before = this.known.get(keyOf(this.masks, state));
    if (before && 'length' in before) return before.length.weighted;
    const { readings, count, far } = this.book.boundsOf(set);
    const { cells, walkSeconds } = this.masks;
    // With points open, the first power-up may do no more than close what is in the way.
    const inTheWay = walkSeconds[forced] ?? 0;
    const first = open !== 0 && forced > 0 ? Math.min(nearest, inTheWay) : nearest;
    const longest = Math.max(inTheWay, walkSeconds[spent] ?? 0, cells.elsewhere);
    const longer = Math.max(0, weight * (longest - nearest), open === 0 ? far : 0);
    const walks = nearest * count + weight * first + longer;
    return Math.max(before?.least ?? 0, readings + walks + this.book.opening(set, open));
  }

  private lastWalk({ forced, spent }: State): number {
    const { cells, walkSeconds } = this.masks;
    return Math.max(walkSeconds[Math.max(forced, spent)] ?? 0, cells.elsewhere);
  }
}

interface Option {
  move: Move;
  onOverload: State;
  onHolds: State;
  leastHolds: number;
  /** A bound below the weighted seconds of the play that begins with the move. */
  least: number;
}
