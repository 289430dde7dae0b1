import { energisedSections } from '@lampwright/harness';
import type { Cells } from './cells';
import type { Allows } from './search';
import type { Question } from './types';

/**
 * Whether a step would energise other sections in question than the last power-up did: a hard trip is never repeated
 * with nothing changed. O(sections) once, then O(cells) a step.
 */
export function tellsMore({ tree, open, poweredWith = open }: Question, cells: Cells): Allows {
  const before = energisedSections(tree, poweredWith);
  const wasLit = Array.from(cells.section, (section) => before[section] === true);
  const cellsInQuestion = [...wasLit.keys()].filter((cell) => (cells.weight[cell] ?? 0) > 0);
  return ({ onOverload }) => {
    const lit = new Set(onOverload.cells);
    return cellsInQuestion.some((cell) => lit.has(cell) !== wasLit[cell]);
  };
}
