import type { Cells } from '../cells';
import type { Length } from '../playOut';
import type { Situation } from '../situation';
import { Steps } from '../steps';
import { subCells } from '../subCells';
import { ExactSearch } from './exactSearch';
import { masksOf, walkSecondsOf, type Masks } from './masks';
import { openingState } from './state';

/** More cells than this would make the numbers of states too large, and the search too long. */
const MOST_CELLS = 15;

/**
 * The best plays of all from situations near the end of a trace. What was found of the same cells is kept, whatever was
 * open then.
 */
export class Tails {
  private readonly walkSeconds: number[];
  private readonly searches = new Map<string, Tail>();
  private readonly meter = new Steps(0);

  constructor(private readonly cells: Cells) {
    this.walkSeconds = walkSecondsOf(cells);
  }

  /** Whether a situation has at most so many cells in question, and few enough that join them. */
  holds({ count, cells }: Situation, most: number): boolean {
    return count <= most && cells.length <= MOST_CELLS;
  }

  /**
   * The length of the best play of a situation that is near enough to the end, with at least two cells in question.
   *
   * @throws StepsSpent when the steps do not suffice.
   */
  length(situation: Situation, steps: Steps): Length {
    const { masks, place, search } = this.tailOf(situation);
    const open = situation.open.map((v) => place.get(v) ?? 0);
    const state = openingState(masks, open, situation.forced, situation.spent);
    // One meter for all searches, which outlive the steps of whoever asked first.
    this.meter.left = steps.left;
    try {
      const length = search.length(state, Infinity);
      if (!length) throw new Error('two cells in question that no point parts');
      return length;
    } finally {
      steps.left = this.meter.left;
    }
  }

  private tailOf({ cells }: Situation): Tail {
    const key = String.fromCharCode(...cells);
    const known = this.searches.get(key);
    if (known) return known;
    const { cells: few, place } = subCells(this.cells, cells);
    const masks = masksOf(few, this.walkSeconds);
    const tail = { masks, place, search: new ExactSearch(masks, this.meter) };
    this.searches.set(key, tail);
    return tail;
  }
}

interface Tail {
  masks: Masks;
  /** By cell of the question: its number among the few. */
  place: ReadonlyMap<number, number>;
  search: ExactSearch;
}
