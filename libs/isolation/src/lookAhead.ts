import { exactFinding } from './exact/exactFinding';
import type { Finding } from './finding';
import { greedy } from './greedy';
import { easiestFirst, halfByCount } from './habits';
import { playOut, type Policy } from './playOut';
import { Search, type Allows, type Breadth } from './search';
import type { Situation, Workbench } from './situation';
import { Steps, within } from './steps';

/** Above this many cells even one round of playing out every choice takes too long. */
const MOST_CELLS_TO_SEARCH = 400;

/** What stands behind a choice while it is ranked. */
const policies = [greedy(1), greedy(3)];

/** Plays that the advice is never worse than, from the first step on. */
const baselines = [greedy(1), greedy(3), easiestFirst, halfByCount];

/** A glance at every choice of every turn. */
const glance: Breadth = { mostNew: 4, width: () => 1, exactFrom: 4 };

/** From looking into a few choices of the first turns to looking into several of all turns. */
const breadths: Breadth[] = [
  { mostNew: 4, width: (count) => (count > 20 ? 3 : 1), exactFrom: 5 },
  { mostNew: 4, width: () => 3, exactFrom: 5 },
  { mostNew: 4, width: () => 5, exactFrom: 5 },
  { mostNew: 4, width: () => 8, exactFrom: 5 },
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
  let found: Finding | null = null;
  const offer = (next: Finding | null) => {
    if (next && (!found || next.length.weighted < found.length.weighted)) found = next;
  };
  for (const policy of baselines) offer(playedBy(bench, situation, policy, allows));
  if (situation.cells.length > MOST_CELLS_TO_SEARCH) return found;
  offer(searched(bench, situation, glance, steps, allows));
  const known = (found as Finding | null)?.length.weighted ?? Infinity;
  const exact = exactFinding(bench, situation, known + ROUNDING, steps, steps.left / 2, allows);
  if (exact) return exact;
  for (const breadth of breadths) {
    const wider = searched(bench, situation, breadth, steps, allows);
    if (!wider) break;
    offer(wider);
  }
  return found;
}

/** Several steps worth comparing, best first, each with the length of the play behind it. */
export function candidates(bench: Workbench, situation: Situation, most: number): Finding[] {
  const search = new Search(
    bench,
    policies,
    { mostNew: 2, width: () => 1, exactFrom: 5 },
    new Steps(Infinity),
  );
  return search
    .candidates(situation, most, () => true)
    .map((played) => ({ ...played, optimal: false }));
}

function playedBy(
  bench: Workbench,
  situation: Situation,
  policy: Policy,
  allows: Allows,
): Finding | null {
  const step = policy(bench, situation);
  if (!allows(step)) return null;
  return { step, length: playOut(bench, situation, policy), optimal: false };
}

function searched(
  bench: Workbench,
  situation: Situation,
  breadth: Breadth,
  steps: Steps,
  allows: Allows,
): Finding | null {
  return within(steps, steps.left, (left) => {
    const best = new Search(bench, policies, breadth, left).best(situation, allows);
    return best && { ...best, optimal: false };
  });
}
