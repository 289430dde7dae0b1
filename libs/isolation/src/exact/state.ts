import type { Masks } from './masks';

/** A state of the exact search: a situation in bits and ranks. */
export interface State {
  set: number;
  /** Open points with cells of the set on both sides. */
  open: number;
  /** Ranks of the walks to the farthest open point that must be closed next, and that no longer matters. */
  forced: number;
  spent: number;
}

/** The state with all cells in question, these points open, and walks owed. */
export function openingState(
  masks: Masks,
  open: readonly number[],
  forcedWalk: number,
  spentWalk: number,
): State {
  return {
    set: masks.everything,
    open: open.reduce((mask, v) => mask | (1 << v), 0),
    forced: masks.walkSeconds.indexOf(forcedWalk),
    spent: masks.walkSeconds.indexOf(spentWalk),
  };
}

/** One number for a state, exact below 2^53. */
export function keyOf({ cells, walkSeconds }: Masks, { set, open, forced, spent }: State): number {
  const span = 2 ** cells.size;
  return ((forced * walkSeconds.length + spent) * span + open) * span + set;
}

/** The state after `set` is left in question with these points open: each still matters, is in the way, or is spent. */
export function settle(masks: Masks, set: number, open: number, spentBefore: number): State {
  let useful = 0;
  let forced = 0;
  let spent = spentBefore;
  for (let rest = open; rest !== 0; rest &= rest - 1) {
    const v = 31 - Math.clz32(rest & -rest);
    const within = set & (masks.beyond[v] ?? 0);
    const walk = masks.walkRank[v] ?? 0;
    if (within === 0) {
      if (walk > spent && (masks.walkSeconds[walk] ?? 0) > 0) spent = walk;
    } else if (within === set) {
      if (walk > forced) forced = walk;
    } else useful |= 1 << v;
  }
  return { set, open: useful, forced, spent };
}
