import type { Cells } from '../cells';
import type { Finding } from '../finding';
import type { Length } from '../playOut';
import { within, type Steps } from '../steps';
import type { Situation, Step, Workbench } from '../situation';
import { ExactSearch } from './exactSearch';
import { bitsOf, masksOf, MOST_MASKED_CELLS, type Masks } from './masks';
import type { Move } from './moves';
import type { State } from './state';

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
  const state = stateOf(masks);
  const stepOf = ({ open, walk }: Move) => bench.step(situation, bitsOf(open), walk >= state.spent);

  return within(whole, share, (steps) => {
    const best = new ExactSearch(masks, steps).best(state, limit, (move) => {
      const step = stepOf(move);
      return step !== null && allows(step);
    });
    const step = best && stepOf(best.move);
    return step && { step, length: best.length, optimal: true };
  });
}

/**
 * The length of the best play of all for a question of few cells.
 *
 * @throws StepsSpent when the steps do not suffice.
 */
export function exactLength(cells: Cells, steps: Steps): Length | null {
  const masks = masksOf(cells);
  return new ExactSearch(masks, steps).length(stateOf(masks), Infinity);
}

function stateOf(masks: Masks): State {
  const { open, blockingWalk, spentWalk } = masks.cells;
  const rankOf = (walk: number) => masks.walkSeconds.indexOf(walk);
  return {
    set: masks.everything,
    open: open.reduce((mask, v) => mask | (1 << v), 0),
    forced: rankOf(blockingWalk),
    spent: rankOf(spentWalk),
  };
}
