import type { Advice } from '@lampwright/isolation';
import type { OwnFigures } from '../../store/adviser';
import type { NextPowerUp } from '../../store/use-next-power-up';
import { durationWords } from '../../words/duration-words';
import { useTraceWords, type TraceWords } from '../../words/use-trace-words';

/** A saving under this many seconds is not worth a sentence. */
const WORTH_SAYING = 15;

/** Why the power-up on the screen, in one sentence or two, with its own numbers. */
export function useReason({ advised, easiestFirstSeconds, own }: NextPowerUp): string {
  const t = useTraceWords();
  if (own) return ownReason(own, t);
  const extra = easiestFirstSeconds - advised.expectedSeconds;
  if (extra < WORTH_SAYING) return splitWords(advised, t);
  return `${splitWords(advised, t)} ${t('narrow.oneByOne', { time: durationWords(extra, t) })}`;
}

/** What the person's own choice is worth beside the advice. */
export function ownReason({ advice, beside }: OwnFigures, t: TraceWords): string {
  const loss = advice.expectedSeconds - beside.expectedSeconds;
  const words =
    loss < WORTH_SAYING
      ? t('narrow.asGood')
      : t('narrow.against', { time: durationWords(loss, t) });
  return `${splitWords(advice, t)} ${words}`;
}

/** How a power-up parts what is left, and what it costs. */
export function splitWords(advice: Advice, t: TraceWords): string {
  const overload = Math.round(advice.overloadProbability * 100);
  const { overload: ifOverload, holds: ifHolds } = advice.seconds;
  const expected =
    advice.overloadProbability * ifOverload + (1 - advice.overloadProbability) * ifHolds;
  if (overload === 0 || overload === 100) return t('narrow.certain');
  const figures = { a: overload, b: 100 - overload, seconds: durationWords(expected, t) };
  return advice.toOpen.length > 1
    ? t('narrow.splitsMany', { ...figures, count: advice.toOpen.length })
    : t('narrow.splits', figures);
}
