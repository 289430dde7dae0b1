import type { Finding } from '../finding';
import { within } from '../steps';
import type { Situation, Step, Workbench } from '../situation';
import { ExactSearch } from './exactSearch';
import { bitsOf, masksOf, MOST_MASKED_CELLS } from './masks';
import type { Move } from './moves';
import type { State } from './state';

/**
 * The best play of all, or `null` when the question has too many cells, or more decisions to look at than `steps`.
 * `limit` is the weighted seconds of a play known before; `allows` says which first steps may be proposed.
 */
export function exactFinding(
  bench: Workbench,
  situation: Situation,
  limit: number,
  steps: number,
  allows: (step: Step) => boolean,
): Finding | null {
  if (bench.cells.size > MOST_MASKED_CELLS) return null;
  const masks = masksOf(bench.cells);
  const rankOf = (walk: number) => masks.walkSeconds.indexOf(walk);
  const state: State = {
    set: masks.everything,
    open: situation.open.reduce((open, v) => open | (1 << v), 0),
    forced: rankOf(situation.forced),
    spent: rankOf(situation.spent),
  };
  const stepOf = ({ open, walk }: Move) => bench.step(situation, bitsOf(open), walk >= state.spent);

  return within(steps, (left) => {
    const search = new ExactSearch(masks, left);
    const best = search.best(state, limit, (move) => {
      const step = stepOf(move);
      return step !== null && allows(step);
    });
    const step = best && stepOf(best.move);
    if (!step) return null;
    const { weighted, move } = best;
    return { step, length: { weighted, worst: search.worst(state, move) }, optimal: true };
  });
}
