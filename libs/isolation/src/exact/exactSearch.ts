import type { Steps } from '../steps';
import { MoveList, type Move } from './moves';
import type { Masks } from './masks';
import { SetBook } from './setFacts';
import { keyOf, settle, type State } from './state';

/** Seconds by which two sums of the same play may differ. */
const ROUNDING = 1e-9;

/** The best first move, with the weighted seconds of the best play. */
export interface Best {
  move: Move;
  weighted: number;
}

/** What is known of a state: its value, or a bound below it. */
interface Known {
  lower: number;
  exact: boolean;
}

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

  /** The best play of fewer than `limit` weighted seconds, or `null` when there is none. */
  best(state: State, limit: number, allows: (move: Move) => boolean = () => true): Best | null {
    let best: Best | null = null;
    let bound = limit;
    for (const option of this.options(state, limit)) {
      if (option.least >= bound) break;
      if (!allows(option.move)) continue;
      const weighted = this.total(option, bound);
      if (weighted >= bound) continue;
      bound = weighted;
      best = { move: option.move, weighted };
    }
    return best;
  }

  /** The longest that the best play takes once the move is made, the move included. */
  worst(state: State, move: Move): number {
    const { cells } = this.masks;
    const { onOverload, onHolds } = this.outcomes(state, move);
    const lit = this.book.of(onOverload.set).weight;
    const seconds = (move.cost - lit * cells.overloadSeconds) / this.book.of(state.set).weight;
    const overload = cells.overloadSeconds + this.worstFrom(onOverload);
    return seconds + Math.max(overload, this.worstFrom(onHolds));
  }

  private worstFrom(state: State): number {
    const { weight, useful } = this.book.of(state.set);
    const value = this.value(state, Infinity);
    if (useful.length === 0) return value / weight;
    // The value is known, so that all but the best moves are left at once.
    const best = this.best(state, value + weight * ROUNDING);
    return best ? this.worst(state, best.move) : value / weight;
  }

  /** The value of a state when it is below `limit`, otherwise infinity. */
  private value(state: State, limit: number): number {
    const { cells, walkSeconds } = this.masks;
    const { weight, useful } = this.book.of(state.set);
    if (useful.length === 0) {
      const walk = Math.max(walkSeconds[Math.max(state.forced, state.spent)] ?? 0, cells.elsewhere);
      return weight * walk;
    }
    const key = keyOf(this.masks, state);
    const before = this.known.get(key);
    if (before?.exact) return before.lower;
    if (before && before.lower >= limit) return Infinity;
    let value = Infinity;
    let bound = limit;
    for (const option of this.options(state, limit)) {
      if (option.least >= bound) break;
      value = Math.min(value, this.total(option, bound));
      bound = Math.min(bound, value);
    }
    this.known.set(
      key,
      value < limit ? { lower: value, exact: true } : { lower: limit, exact: false },
    );
    return value;
  }

  /** Weighted seconds of a move and the best play after it when below `bound`, otherwise infinity. */
  private total({ move, onOverload, onHolds, leastHolds }: Option, bound: number): number {
    const overload = this.value(onOverload, bound - move.cost - leastHolds);
    const holds = this.value(onHolds, bound - move.cost - overload);
    const total = move.cost + overload + holds;
    return total < bound ? total : Infinity;
  }

  private options(state: State, limit: number): Option[] {
    const moves = new MoveList(this.book, state, limit, this.steps);
    const options: Option[] = [];
    for (const move of moves.list()) {
      const { onOverload, onHolds } = this.outcomes(state, move);
      const leastHolds = this.least(onHolds);
      const least = move.cost + this.least(onOverload) + leastHolds;
      if (least < limit) options.push({ move, onOverload, onHolds, leastHolds, least });
    }
    return options.sort((a, b) => a.least - b.least);
  }

  private outcomes(state: State, move: Move): { onOverload: State; onHolds: State } {
    const spent = state.spent > move.walk ? state.spent : 0;
    return {
      onOverload: settle(this.masks, move.energised, move.open, spent),
      onHolds: settle(this.masks, state.set & ~move.energised, move.open, spent),
    };
  }

  /** A bound below the value of a state that a reading left. */
  private least(state: State): number {
    const { cells, walkSeconds } = this.masks;
    const { set, open, forced, spent } = state;
    const { weight, useful, readings, nearest, count, far } = this.book.of(set);
    const must = Math.max(walkSeconds[Math.max(forced, spent)] ?? 0, cells.elsewhere);
    if (useful.length === 0) return weight * must;
    const known = this.known.get(keyOf(this.masks, state))?.lower ?? 0;
    const walks = nearest * (count + weight);
    const longer = Math.max(weight * (must - nearest), open === 0 ? far : 0);
    return Math.max(known, readings + walks + longer + this.book.opening(set, open));
  }
}

interface Option {
  move: Move;
  onOverload: State;
  onHolds: State;
  leastHolds: number;
  least: number;
}
