import type { PartId } from '@lampwright/harness';
import type { Advice, Question } from '@lampwright/isolation';
import { useEffect, useState } from 'react';
import { usePlanner } from '../../../lib/planner';
import { planFor } from './plan-for';
import { samePoints } from './same-points';

/** The planner's answers to one question. */
export interface Advised {
  /** The best power-up that it found; `null` without a question, when one section is left, or while it is thought. */
  advised: Advice | null;
  /** The figures of the points that the person picked; `null` where those are the advised ones, or while they are reckoned. */
  own: Advice | null;
  /** True while the planner is at it. */
  pending: boolean;
}

/** The one door to the planner, which works in a worker. An answer to an earlier question is never shown for a later one. */
export function useAdvice(question: Question | null, chosen: readonly PartId[] | null): Advised {
  const planner = usePlanner();
  const [plan, setPlan] = useState<Answer<Question, Advice | null> | null>(null);
  const [figures, setFigures] = useState<Answer<readonly PartId[], Advice | null> | null>(null);
  const [failure, setFailure] = useState<{ error: unknown } | null>(null);

  useEffect(() => {
    if (!question) return undefined;
    return planFor(planner, question, {
      tell: (advice) => setPlan({ asked: question, answer: advice }),
      fail: (error) => setFailure({ error }),
    });
  }, [planner, question]);

  const planned = plan !== null && plan.asked === question;
  const advised = planned ? plan.answer : null;
  const followed = !advised || !chosen || samePoints(chosen, advised.open);
  const picked = followed ? null : chosen;
  useEffect(() => {
    if (!question || !picked) return undefined;
    let current = true;
    planner.ask('adviceFor', question, picked).then(
      (answer) => current && setFigures({ asked: picked, answer }),
      (error: unknown) => current && setFailure({ error }),
    );
    return () => {
      current = false;
    };
  }, [planner, question, picked]);

  // The nearest error boundary tells the person, as it does of all that goes wrong while a screen is made.
  if (failure) throw failure.error;
  const reckoned = picked !== null && figures !== null && figures.asked === picked;
  return {
    advised,
    own: reckoned ? figures.answer : null,
    pending: question !== null && (!planned || (picked !== null && !reckoned)),
  };
}

interface Answer<Asked, Value> {
  asked: Asked;
  answer: Value;
}
