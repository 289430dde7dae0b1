import { chakra } from '@chakra-ui/react';
import { useEffect, useState } from 'react';
import { useTraceContext, useTraceSession } from '../store/trace-session';
import { minutesBetween } from '../words/minutes-between';
import { useTraceWords } from '../words/use-trace-words';

const Chip = chakra('span', {
  base: {
    display: { base: 'none', sm: 'block' },
    color: 'fg.muted',
    fontSize: 'sm',
    whiteSpace: 'nowrap',
  },
});

/** How long this trace has taken, by this device's clock; it stops at the signature. */
export function MinutesSoFar() {
  const t = useTraceWords();
  const { store } = useTraceSession();
  const openedAt = useTraceContext((context) => context.record.openedAt);
  const signedAt = useTraceContext((context) => context.signature?.at ?? null);
  const now = useMinute();
  if (!store && !signedAt) return null;
  const minutes = minutesBetween(openedAt, signedAt ?? now);
  return <Chip>{t(signedAt ? 'time.minutes' : 'page.minutesSoFar', { count: minutes })}</Chip>;
}

/** The time, renewed twice a minute. */
function useMinute(): string {
  const [now, setNow] = useState(() => new Date().toISOString());
  useEffect(() => {
    const timer = setInterval(() => setNow(new Date().toISOString()), 30_000);
    return () => clearInterval(timer);
  }, []);
  return now;
}
