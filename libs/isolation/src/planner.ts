import { adviceOf } from './advice';
import { cellsOf } from './cells';
import { closingSeconds } from './costs';
import { lookAhead } from './lookAhead';
import { openingSituation, Workbench } from './situation';
import { Steps } from './steps';
import { tellsMore } from './tellsMore';
import type { Plan, Planner, Question } from './types';

/** How much the planner may think. Steps are power-ups tried in thought, so that answers do not depend on a clock. */
export interface PlannerOptions {
  /** At most about so many steps for one question. Default 40000, some tens of milliseconds at 60 sections. */
  steps?: number;
}

/**
 * A planner that minimises the expected seconds until the section is known and everything is closed again.
 *
 * @throws RangeError from `plan` when no probability is above 0: ask `Belief.contradicted` first.
 */
export function createPlanner(options: PlannerOptions = {}): Planner {
  return { plan: (question) => planWith(question, options.steps ?? 40_000) };
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
