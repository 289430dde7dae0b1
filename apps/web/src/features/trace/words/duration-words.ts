import type { TraceWords } from './use-trace-words';

/** Seconds as a person says them: to 5 s under a minute and a half, to the half minute under five, then whole minutes. */
export function durationWords(seconds: number, t: TraceWords): string {
  if (seconds < 90) return t('time.seconds', { count: Math.max(5, Math.round(seconds / 5) * 5) });
  const minutes = seconds / 60;
  const rounded = minutes < 5 ? Math.round(minutes * 2) / 2 : Math.round(minutes);
  return t('time.minutes', { count: rounded });
}
