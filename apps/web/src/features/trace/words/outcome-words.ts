import type { Feed, Seen } from '@lampwright/trace';
import type { TraceWords } from './use-trace-words';

/** What was seen, in the words of the feed that showed it. */
export function outcomeWords(seen: Seen | 'dark', feed: Feed | null, t: TraceWords): string {
  if (seen === 'flickers') return t('answer.flickered');
  if (seen === 'dark') return t('answer.darkShort');
  return feed ? t(`feed.${feed.kind}.${seen}`) : t(`answer.${seen}`);
}
