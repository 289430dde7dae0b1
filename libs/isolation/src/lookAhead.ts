import { greedy } from './greedy';
import { playOut, type Length } from './playOut';
import { Search, StepsSpent, type Breadth } from './search';
import type { Situation, Step, Workbench } from './situation';

/** The best step found, how long its play is, and how far that is vouched for. */
export interface Finding {
  step: Step;
  length: Length;
}

/** Above this many cells even one round of playing out every choice takes too long. */
const MOST_CELLS_TO_SEARCH = 400;

const policies = [greedy(1), greedy(3)];

const breadths: Breadth[] = [
  { mostNew: 2, width: () => 1 },
  { mostNew: 2, width: () => 2 },
  { mostNew: 2, width: (count) => (count > 20 ? 2 : 3) },
  { mostNew: 2, width: (count) => (count > 20 ? 2 : count > 8 ? 3 : 8) },
];

/** Searches ever more broadly until the steps are spent, and keeps the last search that came to its end. */
export function lookAhead(bench: Workbench, situation: Situation, steps: number): Finding {
  let found = greedyFinding(bench, situation);
  if (situation.cells.length > MOST_CELLS_TO_SEARCH) return found;
  for (const breadth of breadths) {
    const wider = searched(new Search(bench, policies, breadth, steps), situation);
    if (!wider) break;
    if (wider.length.weighted <= found.length.weighted) found = wider;
  }
  return found;
}

/** Several steps worth comparing, best first, each with the length of the play behind it. */
export function candidates(bench: Workbench, situation: Situation, most: number): Finding[] {
  const breadth = { mostNew: 2, width: () => 1 };
  return new Search(bench, policies, breadth, Infinity).candidates(situation, most);
}

function greedyFinding(bench: Workbench, situation: Situation): Finding {
  const policy = greedy(1);
  return {
    step: policy(bench, situation),
    length: playOut(bench, situation, policy),
  };
}

function searched(search: Search, situation: Situation): Finding | null {
  try {
    return search.best(situation);
  } catch (error) {
    if (error instanceof StepsSpent) return null;
    throw error;
  }
}
