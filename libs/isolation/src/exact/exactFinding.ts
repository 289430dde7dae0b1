import type { Finding } from '../finding';
import { within, type Steps } from '../steps';
import type { Situation, Step, Workbench } from '../situation';
import { ExactSearch } from './exactSearch';
import { bitsOf, masksOf, MOST_MASKED_CELLS } from './masks';
import type { Move } from './moves';
import { openingState } from './state';

/**
 * The best play of all, or `null` when the question has too many cells, or more decisions to look at than its share
 * of the steps. `limit` is the weighted seconds of a play known before; `allows` says which first steps may be proposed.
 */
export function exactFinding(
  bench: Workbench,
  situation: Situation,
  limit: number,
  whole: Steps,
  share: number,
  allows: (step: Step) => boolean,
): Finding | null {
  if (bench.cells.size > MOST_MASKED_CELLS) return null;
  const masks = masksOf(bench.cells);
  const { open, blockingWalk, spentWalk } = bench.cells;
  const state = openingState(masks, open, blockingWalk, spentWalk);
  const stepOf = (move: Move) => bench.step(situation, bitsOf(move.open), move.walk >= state.spent);

  return within(whole, share, (steps) => {
    const best = new ExactSearch(masks, steps).best(state, limit, (move) => {
      const step = stepOf(move);
      return step !== null && allows(step);
    });
    const step = best && stepOf(best.move);
    return step && { step, length: best.length, optimal: true };
  });
}
