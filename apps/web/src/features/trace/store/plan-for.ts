import {
  QUICK_STEPS,
  THOROUGH_STEPS,
  type Advice,
  type Plan,
  type Question,
} from '@lampwright/isolation';
import type { PlannerClient } from '../../../lib/planner';
import { samePoints } from './same-points';

/** For so long a first answer waits for the better one; nobody's hand is quicker. */
const PATIENCE_MS = 150;

/** What becomes of the planner's answers. */
export interface PlanListener {
  tell(advice: Advice | null): void;
  fail(error: unknown): void;
}

/**
 * Asks for a first answer and a better one. What a person may already be walking to is not taken from the screen: once
 * the first answer stands there, the better one only sharpens its figures, and where it names other points it is
 * dropped; the next question is thought through anew. Answers how to stop listening.
 */
export function planFor(
  planner: PlannerClient,
  question: Question,
  { tell, fail }: PlanListener,
): () => void {
  let stopped = false;
  let shown: Advice | null = null;
  let patience: ReturnType<typeof setTimeout> | undefined;
  const show = (advice: Advice | null) => {
    if (stopped || (shown && advice && !samePoints(shown.open, advice.open))) return;
    shown = advice;
    tell(advice);
  };
  const failed = (error: unknown) => {
    if (!stopped) fail(error);
  };
  planner.ask('plan', question, QUICK_STEPS).then((first) => {
    patience = setTimeout(() => show(adviceOf(first)), PATIENCE_MS);
  }, failed);
  planner.ask('plan', question, THOROUGH_STEPS).then((better) => {
    clearTimeout(patience);
    show(adviceOf(better));
  }, failed);
  return () => {
    stopped = true;
    clearTimeout(patience);
  };
}

function adviceOf(plan: Plan): Advice | null {
  return plan.kind === 'powerUp' ? plan.advice : null;
}
