import type { PartId } from '@lampwright/harness';
import { adviceFor, plan, type Advice, type Question } from '@lampwright/isolation';
import { useMemo } from 'react';
import { samePoints } from './same-points';

/** The planner's answers to one question. */
export interface Advised {
  /** The best power-up that it found; `null` without a question, or when one section is left. */
  advised: Advice | null;
  /** The figures of the points that the person picked; `null` where those are the advised ones. */
  own: Advice | null;
}

/** A question is a value that never changes, so its plan is worked out once however many screens ask. */
const planned = new WeakMap<Question, Advice | null>();

function adviceOn(question: Question): Advice | null {
  let advice = planned.get(question);
  if (advice === undefined) {
    const found = plan(question);
    advice = found.kind === 'powerUp' ? found.advice : null;
    planned.set(question, advice);
  }
  return advice;
}

/** The one door to the planner. It is quick enough to be asked while rendering; a worker could answer here instead. */
export function useAdvice(question: Question | null, chosen: readonly PartId[] | null): Advised {
  return useMemo(() => {
    const advised = question && adviceOn(question);
    const followed = !advised || !chosen || samePoints(chosen, advised.open);
    return { advised, own: followed || !question ? null : adviceFor(question, chosen) };
  }, [question, chosen]);
}
