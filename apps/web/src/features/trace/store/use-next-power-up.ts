import type { PartId } from '@lampwright/harness';
import type { Advice } from '@lampwright/isolation';
import { situation } from '@lampwright/trace';
import { useMemo } from 'react';
import type { OwnFigures } from './adviser';
import { useTraceContext } from './trace-session';
import { useAdvice, useOwnFigures, type Answer } from './use-advice';

/** The power-up that stands on the screen. */
export interface NextPowerUp {
  /** What the planner proposes, kept with the reading for the replay. */
  advised: Advice;
  /** Expected seconds from here of unplugging whatever is easiest, one by one. */
  easiestFirstSeconds: number;
  /** Every point to be open when power goes on. */
  open: PartId[];
  toOpen: PartId[];
  toClose: PartId[];
  /** The figures of a set that the person picked; `null` while the advice is followed. */
  own: OwnFigures | null;
}

/** What is to be done next: the person's own choice while one stands, else the advice. */
export function useNextPowerUp(): Answer<NextPowerUp> {
  const question = useTraceContext((context) => situation(context)?.question ?? null);
  const chosen = useTraceContext((context) => context.chosen);
  const open = useTraceContext((context) => context.open);
  const advice = useAdvice(question);
  const own = useOwnFigures(question, chosen);
  const value = useMemo(() => {
    if (!advice.value?.advice) return null;
    const { advice: advised, easiestFirstSeconds } = advice.value;
    if (own.followed) {
      const { toOpen, toClose } = advised;
      return { advised, easiestFirstSeconds, open: advised.open, toOpen, toClose, own: null };
    }
    if (!own.value) return null;
    const { open: picked } = own.value.advice;
    return {
      advised,
      easiestFirstSeconds,
      open: picked,
      toOpen: picked.filter((point) => !open.includes(point)),
      toClose: open.filter((point) => !picked.includes(point)),
      own: own.value,
    };
  }, [advice.value, own.value, own.followed, open]);
  return { value, failure: advice.failure ?? own.failure };
}
