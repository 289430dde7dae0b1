import type { PartId } from '@lampwright/harness';
import { adviceOf } from './advice';
import type { Cells } from './cells';
import { candidates } from './lookAhead';
import { openingSituation, Workbench } from './situation';
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

/** The best power-ups that open other points than the advice does, best first. About the time of one plan. */
export function alternativesTo(
  question: Question,
  cells: Cells,
  advice: Advice,
  most: number,
): Alternative[] {
  const bench = new Workbench(cells);
  const proposed = new Set(advice.open);
  const others: Alternative[] = [];
  for (const found of candidates(bench, openingSituation(cells), 3 * most)) {
    const other = adviceOf(question, cells, found);
    const { open, toOpen, toClose, overloadProbability, expectedSeconds } = other;
    if (open.every((id) => proposed.has(id)) || advice.open.every((id) => open.includes(id))) {
      continue;
    }
    // The same play may be looked into less deeply as an alternative than as the advice.
    const extraSeconds = Math.max(0, expectedSeconds - advice.expectedSeconds);
    others.push({ open, toOpen, toClose, overloadProbability, expectedSeconds, extraSeconds });
    if (others.length === most) break;
  }
  return others;
}
