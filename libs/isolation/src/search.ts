import type { Cells } from './cells';
import { choicesOf } from './choices';
import { Tails } from './exact/Tails';
import type { Length, Policy } from './playOut';
import { finalWalk, type Situation, type Step, type Workbench } from './situation';
import type { Steps } from './steps';

/** How widely a search looks. */
export interface Breadth {
  /** How many steps of a situation are ranked by play: those of the highest rate. */
  tried: number;
  /** How many first steps are looked into. */
  first: number;
  /** At most so many points opened for one power-up. */
  mostNew: number;
  /** How many choices are looked into at a later turn. */
  width: number;
  /** From so many cells in question downwards the best play is searched out; see `Tails.holds`. */
  exactFrom: number;
}

/** What searches of different breadth over the same cells find alike. */
export class Memory {
  readonly tails: Tails;
  private readonly basic = new Map<number, Map<string, Length>[]>();

  constructor(
    cells: Cells,
    readonly policies: readonly Policy[],
  ) {
    this.tails = new Tails(cells);
  }

  /** By base policy, of those with the same `exactFrom`: how long it plays from a situation. */
  basicLengths(exactFrom: number): Map<string, Length>[] {
    const known = this.basic.get(exactFrom) ?? this.policies.map(() => new Map<string, Length>());
    this.basic.set(exactFrom, known);
    return known;
  }
}

/** A step and how long the best play found behind it is. */
export interface Played {
  step: Step;
  length: Length;
}

/** Whether a step may be proposed. */
export type Allows = (step: Step) => boolean;

/**
 * Looks into the best few choices of every situation that the best few choices lead to, and remembers each. Choices are
 * ranked by playing the base policies out behind them, so a search is never worse than the best of these policies, nor
 * than a narrower search. Weighted seconds throughout: expected seconds times the probability of the situation.
 */
export class Search {
  private readonly values = new Map<string, Length>();
  private readonly basic: Map<string, Length>[];

  constructor(
    private readonly bench: Workbench,
    private readonly memory: Memory,
    private readonly breadth: Breadth,
    private readonly steps: Steps,
  ) {
    this.basic = memory.basicLengths(breadth.exactFrom);
  }

  /**
   * Looks into the `most` best ranked of the allowed steps, one after the other, and tells of each how long the play
   * behind it is, closing included.
   *
   * @throws StepsSpent when the steps do not suffice; what was told until then holds.
   */
  lookInto(
    situation: Situation,
    most: number,
    allows: Allows,
    tell: (played: Played) => void,
  ): void {
    for (const { step } of this.ranked(situation, most, allows)) {
      tell({ step, length: this.after(situation, step, (next) => this.value(next)) });
    }
  }

  private value(situation: Situation): Length {
    if (situation.count <= 1) return this.end(situation);
    const { tails } = this.memory;
    if (tails.holds(situation, this.breadth.exactFrom)) return tails.length(situation, this.steps);
    const key = keyOf(situation);
    const known = this.values.get(key);
    if (known) return known;
    let best = this.end(situation);
    let first = true;
    this.lookInto(
      situation,
      this.breadth.width,
      () => true,
      ({ length }) => {
        if (first || length.weighted < best.weighted) best = length;
        first = false;
      },
    );
    this.values.set(key, best);
    return best;
  }

  private ranked(situation: Situation, most: number, allows: Allows): Played[] {
    const steps = this.stepsOf(situation, allows).map((step) => ({
      step,
      length: this.after(situation, step, (next) => this.basicLength(next)),
    }));
    steps.sort((a, b) => a.length.weighted - b.length.weighted);
    return steps.slice(0, most);
  }

  /** The steps of the choices of the highest rate; where walks are owed, a choice may be two of them. */
  private stepsOf(situation: Situation, allows: Allows): Step[] {
    const steps: Step[] = [];
    const seen = new Set<string>();
    const { mostNew, tried } = this.breadth;
    const choices = choicesOf(this.bench, situation, mostNew).sort((a, b) => b.rate - a.rate);
    for (const { open } of choices) {
      if (steps.length >= tried) break;
      const key = open.join();
      if (seen.has(key)) continue;
      seen.add(key);
      const step = this.bench.step(situation, open);
      if (!step || !allows(step)) continue;
      steps.push(step);
      const tidy = situation.spent > 0 && !step.tidies && this.bench.step(situation, open, true);
      if (tidy) steps.push(tidy);
    }
    this.steps.spend(steps.length);
    return steps;
  }

  private end(situation: Situation): Length {
    const walk = finalWalk(this.bench.cells, situation);
    return { weighted: situation.weight * walk, worst: walk };
  }

  private after(situation: Situation, step: Step, follow: (next: Situation) => Length): Length {
    const { overloadSeconds } = this.bench.cells;
    const { seconds, onOverload, onHolds } = step;
    const overload = follow(onOverload);
    const holds = follow(onHolds);
    return {
      weighted:
        situation.weight * seconds +
        onOverload.weight * overloadSeconds +
        overload.weighted +
        holds.weighted,
      worst: seconds + Math.max(overloadSeconds + overload.worst, holds.worst),
    };
  }

  private basicLength(situation: Situation): Length {
    let best: Length = { weighted: Infinity, worst: Infinity };
    for (const [at, policy] of this.memory.policies.entries()) {
      const length = this.played(situation, policy, this.basic[at] ?? new Map());
      if (length.weighted < best.weighted) best = length;
    }
    return best;
  }

  private played(situation: Situation, policy: Policy, known: Map<string, Length>): Length {
    if (situation.count <= 1) return this.end(situation);
    const { tails } = this.memory;
    if (tails.holds(situation, this.breadth.exactFrom)) return tails.length(situation, this.steps);
    const key = keyOf(situation);
    const before = known.get(key);
    if (before) return before;
    this.steps.spend(1);
    const step = policy(this.bench, situation);
    const length = this.after(situation, step, (next) => this.played(next, policy, known));
    known.set(key, length);
    return length;
  }
}

function keyOf({ cells, open, forced, spent }: Situation): string {
  return `${String.fromCharCode(...cells)}|${open.join()}|${forced}|${spent}`;
}
