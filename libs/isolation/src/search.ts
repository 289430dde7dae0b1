import { choicesOf } from './choices';
import { exactLength } from './exact/exactFinding';
import type { Length, Policy } from './playOut';
import { finalWalk, type Situation, type Step, type Workbench } from './situation';
import { subCells } from './subCells';
import type { Steps } from './steps';

/** How widely a search looks. */
export interface Breadth {
  /** How many first steps are looked into. */
  first: number;
  /** At most so many points opened for one power-up. */
  mostNew: number;
  /** How many choices are looked into at a later turn, by the number of cells in question. */
  width: (count: number) => number;
  /** From so many cells in question downwards the best play is searched out. */
  exactFrom: number;
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
    private readonly policies: readonly Policy[],
    private readonly breadth: Breadth,
    private readonly steps: Steps,
  ) {
    this.basic = policies.map(() => new Map());
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
    if (situation.count <= this.breadth.exactFrom) return this.tail(situation);
    const key = keyOf(situation);
    const known = this.values.get(key);
    if (known) return known;
    let best = this.end(situation);
    let first = true;
    this.lookInto(
      situation,
      this.breadth.width(situation.count),
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
    const steps = this.stepsOf(situation)
      .filter(allows)
      .map((step) => ({
        step,
        length: this.after(situation, step, (next) => this.basicLength(next)),
      }));
    steps.sort((a, b) => a.length.weighted - b.length.weighted);
    return steps.slice(0, most);
  }

  private stepsOf(situation: Situation): Step[] {
    const steps: Step[] = [];
    const seen = new Set<string>();
    for (const { open } of choicesOf(this.bench, situation, this.breadth.mostNew)) {
      const key = open.join();
      if (seen.has(key)) continue;
      seen.add(key);
      const step = this.bench.step(situation, open);
      if (!step) continue;
      steps.push(step);
      const tidy = situation.spent > 0 && !step.tidies && this.bench.step(situation, open, true);
      if (tidy) steps.push(tidy);
    }
    this.steps.spend(steps.length);
    return steps;
  }

  /** The best play of a situation with so few cells that it is soon known. */
  private tail(situation: Situation): Length {
    const key = keyOf(situation);
    const known = this.values.get(key);
    if (known) return known;
    const length = exactLength(subCells(this.bench.cells, situation), this.steps);
    if (!length) throw new Error('two cells in question that no point parts');
    this.values.set(key, length);
    return length;
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
    for (const [at, policy] of this.policies.entries()) {
      const length = this.played(situation, policy, this.basic[at] ?? new Map());
      if (length.weighted < best.weighted) best = length;
    }
    return best;
  }

  private played(situation: Situation, policy: Policy, known: Map<string, Length>): Length {
    if (situation.count <= 1) return this.end(situation);
    if (situation.count <= this.breadth.exactFrom) return this.tail(situation);
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
