import { energisedSections } from '@lampwright/harness';
import { lowerBoundSeconds } from './bounds';
import type { Cells } from './cells';
import { pointsOf, powerUpSeconds } from './costs';
import type { Finding } from './finding';
import type { Advice, Question } from './types';

/** Rounding allowed between a plan and the bound that proves it, in seconds. */
const PROVEN_WITHIN = 1e-6;

/** Says a finding in the terms of the question: points instead of cells, and every second counted. O(sections). */
export function adviceOf(
  question: Question,
  cells: Cells,
  { step, length, optimal }: Finding,
): Advice {
  const { tree, timing, elsewhere } = question;
  const before = new Set(question.open);
  const wanted = new Set(step.open.map((cell) => cells.points[cell]?.partId));
  const gone = new Set(
    [...cells.blocking, ...(step.tidies ? cells.spent : [])].map(({ partId }) => partId),
  );
  const useful = new Set(cells.points.map((point) => point?.partId));
  const opened = pointsOf(tree).filter(({ partId }) => wanted.has(partId) && !before.has(partId));
  const toOpen = opened.map(({ partId }) => partId);
  const toClose = question.open.filter((id) => gone.has(id) || (useful.has(id) && !wanted.has(id)));
  const closed = new Set(toClose);
  const open = [...question.open.filter((id) => !closed.has(id)), ...toOpen];
  const expectedSeconds = cells.closing + length.weighted;
  const bound = optimal ? expectedSeconds : Math.min(lowerBoundSeconds(cells), expectedSeconds);
  return {
    open,
    toOpen,
    toClose,
    energised: energisedSections(tree, open).flatMap((lit, index) => (lit ? [index] : [])),
    overloadProbability: step.onOverload.weight,
    seconds: powerUpSeconds(tree, question.open, open, timing, elsewhere),
    expectedSeconds,
    worstSeconds: cells.closing + length.worst,
    lowerBoundSeconds: bound,
    proof: expectedSeconds - bound <= PROVEN_WITHIN ? 'optimal' : 'notProven',
  };
}
