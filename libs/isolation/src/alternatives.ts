import type { PartId, SeparablePoint } from '@lampwright/harness';
import { adviceOf } from './advice';
import type { Cells } from './cells';
import { candidates } from './lookAhead';
import type { Allows } from './search';
import { openingSituation, Workbench } from './situation';
import { tellsMore } from './tellsMore';
import type { Advice, Question } from './types';

/** Another power-up in place of the proposed one. */
export interface Alternative {
  open: PartId[];
  toOpen: PartId[];
  toClose: PartId[];
  overloadProbability: number;
  expectedSeconds: number;
  /** Expected seconds that it takes more than the proposed one. */
  extraSeconds: number;
}

/**
 * The best power-ups that open other points, best first: neither all of the advice's and more, nor only some of them.
 * About the time of one plan.
 */
export function alternativesTo(
  question: Question,
  cells: Cells,
  advice: Advice,
  most: number,
): Alternative[] {
  const tells = tellsMore(question, cells);
  const proposed = new Set(advice.open);
  const opensOthers: Allows = (step) => {
    const ids = step.open.flatMap((cell) => cells.points[cell]?.partId ?? []);
    return ids.some((id) => !proposed.has(id)) && cells.points.some(isProposedBut(ids, proposed));
  };
  const found = candidates(
    new Workbench(cells),
    openingSituation(cells),
    2 * most,
    (step) => tells(step) && opensOthers(step),
  );
  return found.slice(0, most).map((finding) => {
    const { open, toOpen, toClose, overloadProbability, expectedSeconds } = adviceOf(
      question,
      cells,
      finding,
    );
    // The same play may be looked into less deeply behind the advice than behind an alternative.
    const extraSeconds = Math.max(0, expectedSeconds - advice.expectedSeconds);
    return { open, toOpen, toClose, overloadProbability, expectedSeconds, extraSeconds };
  });
}

/** Whether a useful point is open in the advice and not among these. */
function isProposedBut(
  ids: readonly PartId[],
  proposed: ReadonlySet<PartId>,
): (point: SeparablePoint | null) => boolean {
  return (point) => point !== null && proposed.has(point.partId) && !ids.includes(point.partId);
}
