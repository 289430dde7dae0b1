import type { PartId } from '@lampwright/harness';
import type { Advice } from '@lampwright/isolation';
import { situation } from '@lampwright/trace';
import { useMemo } from 'react';
import { useTraceContext } from './trace-session';
import { useAdvice } from './use-advice';

/** The power-up that stands on the screen. */
export interface NextPowerUp {
  /** What the planner proposes, kept with the reading for the replay. */
  advised: Advice;
  /** Every point to be open when power goes on. */
  open: PartId[];
  toOpen: PartId[];
  toClose: PartId[];
  /** The figures of a set that the person picked; `null` while the advice is followed. */
  own: Advice | null;
}

/** What is to be done next: the person's own choice while one stands, else the advice. `null` while there is no question, or
 * no answer yet. */
export function useNextPowerUp(): NextPowerUp | null {
  const question = useTraceContext((context) => situation(context)?.question ?? null);
  const chosen = useTraceContext((context) => context.chosen);
  const open = useTraceContext((context) => context.open);
  const { advised, own, pending } = useAdvice(question, chosen);
  return useMemo(() => {
    if (!advised || pending) return null;
    if (!own) {
      const { toOpen, toClose } = advised;
      return { advised, open: advised.open, toOpen, toClose, own: null };
    }
    return {
      advised,
      open: own.open,
      toOpen: own.open.filter((point) => !open.includes(point)),
      toClose: open.filter((point) => !own.open.includes(point)),
      own,
    };
  }, [advised, own, pending, open]);
}
