import { energisedSections, type PartId } from '@lampwright/harness';
import type { Outcome, Question } from './types';

/** The question that a reading with `open` leaves, when there is one short and it always shows. O(sections). */
export function after(question: Question, open: readonly PartId[], outcome: Outcome): Question {
  const energised = energisedSections(question.tree, open);
  const left = question.probabilities.map((share, at) =>
    energised[at] === (outcome === 'overload') ? share : 0,
  );
  const sum = left.reduce((total, share) => total + share, 0);
  return { ...question, probabilities: left.map((share) => share / sum), open, poweredWith: open };
}
