import { energisedSections, type PartId } from '@lampwright/harness';
import { lowerBoundSeconds } from './bounds';
import { cellsOf } from './cells';
import { powerUpSeconds } from './costs';
import { after } from './after';
import { plan } from './planner';
import type { Advice, Outcome, Planner, Question } from './types';

/**
 * The figures of a power-up that the person picked, with the planner's play behind it. A pick that would tell nothing
 * has an overload probability of 0 or 1. The whole open set is the person's, so nothing is opened or closed besides.
 * About the time of two plans.
 */
export function adviceFor(
  question: Question,
  open: readonly PartId[],
  planner: Planner = { plan },
): Advice {
  const { tree, timing, elsewhere } = question;
  const before = new Set(question.open);
  const wanted = new Set(open);
  const energised = energisedSections(tree, open);
  const total = question.probabilities.reduce((sum, share) => sum + share, 0);
  const lit = question.probabilities.reduce(
    (sum, share, at) => sum + (energised[at] ? share : 0),
    0,
  );
  const seconds = powerUpSeconds(tree, question.open, open, timing, elsewhere);
  const play = { expected: 0, worst: 0 };
  for (const outcome of ['overload', 'holds'] as const satisfies Outcome[]) {
    const probability = (outcome === 'overload' ? lit : total - lit) / total;
    if (!(probability > 0)) continue;
    const next = planner.plan(after(question, open, outcome));
    const rest =
      next.kind === 'known'
        ? { expected: next.closingSeconds, worst: next.closingSeconds }
        : { expected: next.advice.expectedSeconds, worst: next.advice.worstSeconds };
    play.expected += probability * (seconds[outcome] + rest.expected);
    play.worst = Math.max(play.worst, seconds[outcome] + rest.worst);
  }
  return {
    open: [...open],
    toOpen: open.filter((id) => !before.has(id)),
    toClose: question.open.filter((id) => !wanted.has(id)),
    energised: energised.flatMap((on, at) => (on ? [at] : [])),
    overloadProbability: lit / total,
    seconds,
    expectedSeconds: play.expected,
    worstSeconds: play.worst,
    lowerBoundSeconds: Math.min(lowerBoundSeconds(cellsOf(question)), play.expected),
    proof: 'notProven',
  };
}
