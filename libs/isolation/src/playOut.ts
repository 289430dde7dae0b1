import { finalWalk, type Situation, type Step, type Workbench } from './situation';
import { Steps } from './steps';

/** Chooses the next power-up of a situation with at least two cells in question. */
export type Policy = (bench: Workbench, situation: Situation) => Step;

export interface Length {
  /** Expected seconds times the probability of the situation. */
  weighted: number;
  worst: number;
}

/**
 * Plays a policy out against every cell in question. O(cells x power-ups); without recursion, however deep.
 *
 * @throws StepsSpent when all decisions together look at more cells than `looks` has steps.
 */
export function playOut(
  bench: Workbench,
  from: Situation,
  policy: Policy,
  looks = new Steps(Infinity),
): Length {
  const { overloadSeconds } = bench.cells;
  const ahead = [{ situation: from, spent: 0 }];
  let weighted = 0;
  let worst = 0;
  for (let next = ahead.pop(); next; next = ahead.pop()) {
    const { situation, spent } = next;
    if (situation.count <= 1) {
      const walk = finalWalk(bench.cells, situation);
      weighted += situation.weight * walk;
      worst = Math.max(worst, spent + walk);
      continue;
    }
    looks.spend(situation.cells.length);
    const { seconds, onOverload, onHolds } = policy(bench, situation);
    weighted += situation.weight * seconds + onOverload.weight * overloadSeconds;
    ahead.push({ situation: onOverload, spent: spent + seconds + overloadSeconds });
    ahead.push({ situation: onHolds, spent: spent + seconds });
  }
  return { weighted, worst };
}
