import type { PartId } from '@lampwright/harness';
import type { Question } from '@lampwright/isolation';
import { useCallback, useEffect, useMemo, useState, useSyncExternalStore } from 'react';
import type { OwnFigures, Standing } from './adviser';
import { useAdviser } from './adviser-context';
import { samePoints } from './same-points';

/** Why there is no answer, and the way to ask once more. */
export interface Unanswered {
  error: unknown;
  retry: () => void;
}

export interface Answer<Value> {
  /** `null` without a question, and until there is an answer. */
  value: Value | null;
  failure: Unanswered | null;
}

/** What the planner says to a question. */
export function useAdvice(question: Question | null): Answer<Standing> {
  const adviser = useAdviser();
  const value = useSyncExternalStore(adviser.subscribe, () =>
    question ? adviser.standing(question) : null,
  );
  const work = useMemo(
    () => question && ((signal: AbortSignal) => adviser.consider(question, signal)),
    [adviser, question],
  );
  return { value, failure: useWork(work) };
}

/** What points of the person's own are worth; nothing where they are the advised ones. */
export function useOwnFigures(
  question: Question | null,
  chosen: readonly PartId[] | null,
): Answer<OwnFigures> & { followed: boolean } {
  const adviser = useAdviser();
  const advised = useSyncExternalStore(adviser.subscribe, () =>
    question ? (adviser.standing(question)?.advice ?? null) : null,
  );
  const open = chosen && advised && !samePoints(chosen, advised.open) ? chosen : null;
  const value = useSyncExternalStore(adviser.subscribe, () =>
    question && open ? adviser.own(question, open) : null,
  );
  const work = useMemo(
    () => question && open && ((signal: AbortSignal) => adviser.weigh(question, open, signal)),
    [adviser, question, open],
  );
  return { value, failure: useWork(work), followed: open === null };
}

/** Does work while its screen stands; the newest work alone counts. */
function useWork(work: ((signal: AbortSignal) => Promise<void>) | null): Unanswered | null {
  const [attempt, setAttempt] = useState(0);
  const [failed, setFailed] = useState<{ work: unknown; error: unknown } | null>(null);
  useEffect(() => {
    if (!work) return undefined;
    const leaving = new AbortController();
    work(leaving.signal).catch((error: unknown) => {
      if (!leaving.signal.aborted) setFailed({ work, error });
    });
    return () => leaving.abort();
  }, [work, attempt]);
  const retry = useCallback(() => {
    setFailed(null);
    setAttempt((count) => count + 1);
  }, []);
  return failed !== null && failed.work === work ? { error: failed.error, retry } : null;
}
