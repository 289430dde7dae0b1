import type { Steps } from '../steps';
import type { SetBook, SetBounds, SetFacts } from './setFacts';
import type { State } from './state';

/** One power-up of the exact search. */
export interface Move {
  /** Useful points open when power goes on. */
  open: number;
  energised: number;
  /** Seconds to the reading, an overload not counted. */
  seconds: number;
  /** Weighted seconds of the power-up, overloads included. */
  cost: number;
  /** Rank of the walk taken. */
  walk: number;
}

/**
 * Lists every power-up of a state that could lead to a play of fewer than `limit` weighted seconds. Decides point by
 * point, parents first; a branch is left when its openings and walk so far, with the least that the parts it has cut
 * still need, reach the limit. Exponential in the useful points at worst.
 *
 * A point behind another open point makes no difference now. It is opened or closed early only if a longer walk can be
 * saved by it, and opened only if what the walk may save outweighs the handling that an overload would waste.
 */
export class MoveList {
  private readonly found: Move[] = [];
  private readonly facts: SetFacts;
  private readonly bounds: SetBounds;
  private readonly floor: number;

  constructor(
    private readonly book: SetBook,
    private readonly state: State,
    private readonly limit: number,
    private readonly steps: Steps,
  ) {
    this.facts = book.of(state.set);
    this.bounds = book.boundsOf(state.set);
    this.floor = this.bounds.readings + this.facts.nearest * this.bounds.count;
  }

  list(): Move[] {
    this.decide(0, { open: 0, energised: this.state.set, hands: 0, walk: this.state.forced });
    return this.found;
  }

  private decide(at: number, draft: Draft): void {
    this.steps.spend(1);
    if (this.bound(draft) >= this.limit) return;
    const v = this.facts.useful[at];
    if (v === undefined) {
      this.finish(draft);
      return;
    }
    const { beyond, walkRank, cells } = this.book.masks;
    const { open, energised, hands, walk } = draft;
    const bit = 1 << v;
    const wasOpen = (this.state.open & bit) !== 0;
    const reached = Math.max(walk, walkRank[v] ?? 0);
    const closed = wasOpen ? { ...draft, walk: reached } : draft;
    const opened = wasOpen
      ? { open: open | bit, energised, hands, walk }
      : { open: open | bit, energised, hands: hands + (cells.hands[v] ?? 0), walk: reached };
    const within = beyond[v] ?? 0;
    if ((energised & within) !== 0) {
      this.decide(at + 1, closed);
      const rest = energised & ~within;
      if (rest !== 0) this.decide(at + 1, { ...opened, energised: rest });
      return;
    }
    const longer = (walkRank[v] ?? 0) > this.coverRank(v, open);
    this.decide(at + 1, wasOpen ? opened : closed);
    if (longer) this.decide(at + 1, wasOpen ? closed : opened);
  }

  private finish({ open, energised, hands, walk }: Draft): void {
    const { set, spent } = this.state;
    if (energised === set || this.opensInVain(open, energised)) return;
    const { cells, walkSeconds } = this.book.masks;
    const overloads = this.book.of(energised).weight * cells.overloadSeconds;
    const add = (rank: number) => {
      const seconds = cells.powerSeconds + hands + (walkSeconds[rank] ?? 0);
      const cost = this.facts.weight * seconds + overloads;
      this.found.push({ open, energised, walk: rank, seconds, cost });
    };
    add(walk);
    if (spent > walk) add(spent);
  }

  /** Least weighted seconds of any play that begins like the draft. */
  private bound({ open, hands, walk }: Draft): number {
    const { set, open: before, spent } = this.state;
    const { weight, nearest } = this.facts;
    const { far } = this.bounds;
    const { walkSeconds } = this.book.masks;
    const seconds = walkSeconds[walk] ?? 0;
    // What is open then takes one more walk to close; so does what is spent, unless this walk goes out to it.
    const closing = Math.max(nearest, walkSeconds[this.farthestOf(open)] ?? 0);
    const out = walkSeconds[spent > walk ? spent : 0] ?? 0;
    const walked = Math.min(seconds + Math.max(closing, out), Math.max(seconds, out) + closing);
    const walks = weight * (walked - nearest);
    const openings = weight * hands + this.book.opening(set, before | open);
    const least = weight * nearest + far;
    return this.floor + openings + (before === 0 ? Math.max(walks, least) : walks);
  }

  private opensInVain(open: number, energised: number): boolean {
    const { cells, beyond, walkRank, walkSeconds } = this.book.masks;
    const lit = this.book.of(energised).weight;
    const dark = this.facts.weight - lit;
    for (let rest = open & ~this.state.open; rest !== 0; rest &= rest - 1) {
      const v = 31 - Math.clz32(rest & -rest);
      const cover = this.coverRank(v, open);
      if (cover < 0) continue;
      const saved = (walkSeconds[walkRank[v] ?? 0] ?? 0) - (walkSeconds[cover] ?? 0);
      if (beyond[v] !== undefined && (cells.hands[v] ?? 0) * lit >= saved * dark) return true;
    }
    return false;
  }

  /** Rank of the farthest open point that the point lies behind; -1 when it lies behind none. */
  private coverRank(v: number, open: number): number {
    const { cells, walkRank } = this.book.masks;
    let rank = -1;
    for (let up = cells.parent[v] ?? 0; up > 0; up = cells.parent[up] ?? 0) {
      if ((open & (1 << up)) !== 0) rank = Math.max(rank, walkRank[up] ?? 0);
    }
    return rank;
  }

  private farthestOf(open: number): number {
    let rank = 0;
    for (let rest = open; rest !== 0; rest &= rest - 1) {
      rank = Math.max(rank, this.book.masks.walkRank[31 - Math.clz32(rest & -rest)] ?? 0);
    }
    return rank;
  }
}

/** The points decided so far. */
interface Draft {
  open: number;
  energised: number;
  hands: number;
  /** Rank of the farthest point touched. */
  walk: number;
}
