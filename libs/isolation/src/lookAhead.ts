import { choicesOf } from './choices';
import { exactFinding } from './exact/exactFinding';
import type { Finding } from './finding';
import { greedy } from './greedy';
import { halfInOrder } from './halfInOrder';
import { easiestFirst, halfByCount } from './habits';
import { playOut, type Policy } from './playOut';
import { Memory, Search, type Allows, type Breadth } from './search';
import type { Situation, Workbench } from './situation';
import { Steps, within } from './steps';

/** Above this many cells choices are tried by greedy play alone, a few of them. */
const MOST_CELLS_TO_SEARCH = 100;

/** Above this many cells even that takes too long. */
const MOST_CELLS_TO_TRY = 2000;

/** Choices tried by greedy play where there are too many cells to search. */
const TRIED = 6;

/** Cells that the decisions of all plays together may look at, but for those of the first. */
const MOST_LOOKS = 1_000_000;

const greedyPlay = greedy(1);

/** Cells that the first play may look at before it goes on as cheaply as can be, so that it always comes to its end. */
const MOST_GREEDY_LOOKS = 6_000_000;

/** The play that is always known: greedy as long as that can be thought through. */
function firstPlay(): Policy {
  let left = MOST_GREEDY_LOOKS;
  return (bench, situation) => {
    left -= situation.cells.length;
    return left > 0 ? greedyPlay(bench, situation) : halfInOrder(bench, situation);
  };
}

/** What stands behind a choice while it is ranked. */
const policies = [greedy(3)];

/** Plays that the advice is never worse than, from the first step on, unless they take more than `MOST_LOOKS`. */
const baselines = [greedy(3), easiestFirst, halfByCount];

/** Several first steps, and behind each the one that looks best at every turn. */
const glance: Breadth = { tried: 8, first: 6, mostNew: 3, width: 1, exactFrom: 4 };

/**
 * From looking into a few choices of the next turns to looking into several of all turns. Tried on 75 trees of 14 to 61
 * sections, the case plans among them: fewer choices tried, but tried deeper, took less.
 */
const breadths: Breadth[] = [
  { tried: 12, first: 3, mostNew: 3, width: 2, exactFrom: 4 },
  { tried: 12, first: 3, mostNew: 4, width: 3, exactFrom: 5 },
  { tried: 12, first: 5, mostNew: 4, width: 5, exactFrom: 5 },
  { tried: 20, first: 5, mostNew: 4, width: 5, exactFrom: 5 },
  { tried: Infinity, first: 6, mostNew: 4, width: 6, exactFrom: 5 },
];

/** Seconds by which two sums of the same play may differ. */
const ROUNDING = 1e-6;

/**
 * The best step found: proven best by the exact search where that comes to its end within half of the steps, otherwise
 * the best of ever broader searches. The same question gives the same finding.
 */
export function lookAhead(
  bench: Workbench,
  situation: Situation,
  steps: Steps,
  allows: Allows,
): Finding | null {
  let found = playedBy(bench, situation, firstPlay(), allows);
  const offer = (next: Finding | null) => {
    if (next && (!found || next.length.weighted < found.length.weighted)) found = next;
  };
  const looks = new Steps(MOST_LOOKS);
  for (const policy of baselines) {
    offer(within(looks, looks.left, (left) => playedBy(bench, situation, policy, allows, left)));
  }
  const size = situation.cells.length;
  if (size > MOST_CELLS_TO_SEARCH) {
    const tried = size <= MOST_CELLS_TO_TRY ? trials(bench, situation, allows, looks) : [];
    tried.forEach(offer);
    return found;
  }
  const memory = new Memory(bench.cells, policies);
  lookInto(bench, memory, situation, glance, steps, allows, offer);
  const known = found?.length.weighted ?? Infinity;
  const exact = exactFinding(bench, situation, known + ROUNDING, steps, steps.left / 2, allows);
  if (exact) return exact;
  for (const breadth of breadths) lookInto(bench, memory, situation, breadth, steps, allows, offer);
  return found;
}

/** The choices of the highest rate, with greedy play behind each, as far as the looks go. O(cells x power-ups) for each. */
function trials(bench: Workbench, situation: Situation, allows: Allows, looks: Steps): Finding[] {
  return choicesOf(bench, situation, 1)
    .sort((a, b) => b.rate - a.rate)
    .slice(0, TRIED)
    .flatMap(({ open }) => {
      const step = bench.step(situation, open);
      if (!step || !allows(step)) return [];
      const first: Policy = (_, at) => (at === situation ? step : greedyPlay(bench, at));
      const length = within(looks, looks.left, (left) => playOut(bench, situation, first, left));
      return length ? [{ step, length, optimal: false }] : [];
    });
}

/** Several allowed steps worth comparing, best first, each with the length of the play behind it. */
export function candidates(
  bench: Workbench,
  situation: Situation,
  most: number,
  allows: Allows,
): Finding[] {
  if (situation.cells.length > MOST_CELLS_TO_SEARCH) {
    return trials(bench, situation, allows, new Steps(MOST_LOOKS))
      .sort((a, b) => a.length.weighted - b.length.weighted)
      .slice(0, most);
  }
  const found: Finding[] = [];
  const breadth = { ...glance, tried: Infinity, first: most };
  lookInto(
    bench,
    new Memory(bench.cells, policies),
    situation,
    breadth,
    new Steps(Infinity),
    allows,
    (next) => found.push(next),
  );
  return found.sort((a, b) => a.length.weighted - b.length.weighted);
}

function playedBy(
  bench: Workbench,
  situation: Situation,
  policy: Policy,
  allows: Allows,
  looks?: Steps,
): Finding | null {
  const step = policy(bench, situation);
  if (!allows(step)) return null;
  return { step, length: playOut(bench, situation, policy, looks), optimal: false };
}

/** Offers every step that a search has looked into before the steps were spent. */
function lookInto(
  bench: Workbench,
  memory: Memory,
  situation: Situation,
  breadth: Breadth,
  steps: Steps,
  allows: Allows,
  offer: (found: Finding) => void,
): void {
  within(steps, steps.left, (left) => {
    const search = new Search(bench, memory, breadth, left);
    search.lookInto(situation, breadth.first, allows, (played) => {
      offer({ ...played, optimal: false });
    });
    return null;
  });
}
