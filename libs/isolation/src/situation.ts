import type { Cells } from './cells';

/** Where a trace stands, on the cells of the question it began with. */
export interface Situation {
  /** The cells that hold what is in question, and those that join them; parents first. */
  cells: readonly number[];
  /** How many of them are in question, and their probability together. */
  count: number;
  weight: number;
  /** Cells whose point is open and has something in question on both sides; ascending. */
  open: readonly number[];
  /** Walk to the farthest open point that the next power-up must have closed. */
  forced: number;
  /** Walk to the farthest open point that no longer matters. */
  spent: number;
}

/** One power-up as the planner thinks of it. */
export interface Step {
  /** Cells whose useful point is open when power goes on; ascending. */
  open: readonly number[];
  /** Whether all points that no longer matter are closed on this walk too. */
  tidies: boolean;
  /** Seconds to the reading, an overload not counted. */
  seconds: number;
  onOverload: Situation;
  onHolds: Situation;
}

/** The situation in which a question is put. O(cells). */
export function openingSituation(cells: Cells): Situation {
  const all = [...cells.weight.keys()];
  return {
    cells: all,
    count: cells.weight.filter((weight) => weight > 0).length,
    weight: cells.weight.reduce((sum, weight) => sum + weight, 0),
    open: cells.open,
    forced: cells.blockingWalk,
    spent: cells.spentWalk,
  };
}

/** Seconds of walking to close what is open once one cell is left; the closing itself is charged already. */
export function finalWalk(cells: Cells, { forced, spent }: Situation): number {
  return Math.max(forced, spent, cells.elsewhere);
}

/** Scratch room for one question, so that millions of steps allocate only what they keep. */
export class Workbench {
  /** By cell: probability, and number of cells in question, fed through it within the surveyed situation. */
  readonly beyond: Float64Array;
  readonly countBeyond: Int32Array;
  private readonly mark: Int32Array;
  /** By cell: the stamp of the last step that its point was open before, and after. */
  private readonly before: Int32Array;
  private readonly after: Int32Array;
  private stamp = 0;

  constructor(readonly cells: Cells) {
    this.beyond = new Float64Array(cells.size);
    this.countBeyond = new Int32Array(cells.size);
    this.mark = new Int32Array(cells.size);
    this.before = new Int32Array(cells.size);
    this.after = new Int32Array(cells.size);
  }

  /** Fills `beyond` and `countBeyond` for the cells of a situation. O(its cells). */
  survey(situation: Situation): void {
    this.sum(situation.cells);
  }

  /** The same for those of the cells that stay energised with these points open; returns them. O(cells). */
  surveyEnergised(situation: Situation, open: readonly number[]): readonly number[] {
    const energised = open.length > 0 ? this.part(situation, open).energised : situation.cells;
    this.sum(energised);
    return energised;
  }

  /** What a power-up with these points open costs and leads to, or `null` when it would tell nothing. O(cells). */
  step(situation: Situation, open: readonly number[], tidies = false): Step | null {
    const { walk, hands, weight, powerSeconds } = this.cells;
    const { energised, cut } = this.part(situation, open);
    let litWeight = 0;
    let lit = 0;
    for (const v of energised) {
      const share = weight[v] ?? 0;
      litWeight += share;
      if (share > 0) lit += 1;
    }
    if (lit === 0 || lit === situation.count) return null;

    let seconds = powerSeconds;
    let farthest = situation.forced;
    let farthestOpen = 0;
    const moved = ++this.stamp;
    for (const v of situation.open) this.before[v] = moved;
    for (const v of open) {
      farthestOpen = Math.max(farthestOpen, walk[v] ?? 0);
      this.after[v] = moved;
      if (this.before[v] === moved) continue;
      seconds += hands[v] ?? 0;
      farthest = Math.max(farthest, walk[v] ?? 0);
    }
    for (const v of situation.open) {
      if (this.after[v] !== moved) farthest = Math.max(farthest, walk[v] ?? 0);
    }
    if (tidies) farthest = Math.max(farthest, situation.spent);
    const closesSpent = situation.spent > 0 && farthest >= situation.spent;
    const spent = closesSpent ? 0 : situation.spent;
    seconds += farthest;
    return {
      open,
      tidies: closesSpent,
      seconds,
      onOverload: {
        cells: energised,
        count: lit,
        weight: litWeight,
        open: [],
        forced: 0,
        spent: Math.max(spent, farthestOpen),
      },
      onHolds: this.held(situation, open, cut, lit, spent),
    };
  }

  private held(
    situation: Situation,
    open: readonly number[],
    cut: number[],
    lit: number,
    spentBefore: number,
  ): Situation {
    const { walk } = this.cells;
    const count = situation.count - lit;
    this.sum(cut);
    const stillOpen: number[] = [];
    let forced = 0;
    let spent = spentBefore;
    for (const v of open) {
      const beyond = this.countBeyond[v] ?? 0;
      if (beyond === 0) spent = Math.max(spent, walk[v] ?? 0);
      else if (beyond === count) forced = Math.max(forced, walk[v] ?? 0);
      else stillOpen.push(v);
    }
    const weight = cut.reduce((sum, v) => sum + (this.cells.weight[v] ?? 0), 0);
    return { cells: cut, count, weight, open: stillOpen, forced, spent };
  }

  /** Splits the cells into those that stay energised with these points open and those that are cut off. */
  private part(
    { cells }: Situation,
    open: readonly number[],
  ): { energised: number[]; cut: number[] } {
    const { parent } = this.cells;
    const dark = ++this.stamp;
    for (const v of open) this.mark[v] = dark;
    const energised: number[] = [];
    const cut: number[] = [];
    for (const v of cells) {
      if (this.mark[v] === dark || (v > 0 && this.mark[parent[v] ?? 0] === dark)) {
        this.mark[v] = dark;
        cut.push(v);
      } else energised.push(v);
    }
    return { energised, cut };
  }

  private sum(cells: readonly number[]): void {
    const { beyond, countBeyond, cells: all } = this;
    const { mark } = this;
    const inside = ++this.stamp;
    for (const v of cells) {
      const share = all.weight[v] ?? 0;
      beyond[v] = share;
      countBeyond[v] = share > 0 ? 1 : 0;
      mark[v] = inside;
    }
    for (let at = cells.length - 1; at >= 0; at -= 1) {
      const v = cells[at] ?? 0;
      const up = all.parent[v] ?? -1;
      if (up < 0 || mark[up] !== inside) continue;
      beyond[up] = (beyond[up] ?? 0) + (beyond[v] ?? 0);
      countBeyond[up] = (countBeyond[up] ?? 0) + (countBeyond[v] ?? 0);
    }
  }
}
