import { adviceOf } from './advice';
import { cellsOf } from './cells';
import { closingSeconds } from './costs';
import { lookAhead } from './lookAhead';
import { openingSituation, Workbench } from './situation';
import { Steps } from './steps';
import { tellsMore } from './tellsMore';
import type { Plan, Planner, Question } from './types';

/** For an answer while the person waits: a few tens of milliseconds at 60 parts. */
export const QUICK_STEPS = 18_000;

/** For an answer in the background, or for a forecast: about half a second at 60 parts. */
export const THOROUGH_STEPS = 160_000;

/** How much the planner may think. Steps are power-ups tried in thought, so that answers do not depend on a clock. */
export interface PlannerOptions {
  /** Default `QUICK_STEPS`. */
  steps?: number;
}

/**
 * A planner that minimises the expected seconds until the section is known and everything is closed again.
 *
 * @throws RangeError from `plan` when no probability is above 0: ask `Belief.contradicted` first.
 */
export function createPlanner(options: PlannerOptions = {}): Planner {
  return { plan: (question) => planWith(question, options.steps ?? QUICK_STEPS) };
}

const planner = createPlanner();

/** The plan of a planner with default options. */
export function plan(question: Question): Plan {
  return planner.plan(question);
}

function planWith(question: Question, steps: number): Plan {
  const cells = cellsOf(question);
  const situation = openingSituation(cells);
  if (situation.count <= 1) {
    const section = cells.section.find((index) => index >= 0) ?? 0;
    const { tree, open, timing, elsewhere } = question;
    return {
      kind: 'known',
      section,
      closingSeconds: closingSeconds(tree, open, timing, elsewhere),
    };
  }
  const bench = new Workbench(cells);
  const found =
    lookAhead(bench, situation, new Steps(steps), tellsMore(question, cells)) ??
    lookAhead(bench, situation, new Steps(steps), () => true);
  if (!found) throw new Error('sections in question that no point parts');
  return { kind: 'powerUp', advice: adviceOf(question, cells, found) };
}
