import { useEffect, useState } from 'react';
import { useDraft } from '../../../lib/use-draft';
import { useTraceContext } from './trace-session';

/**
 * Something typed or chosen on the way to an event. It outlives a reload; `clear` forgets it once the event is recorded.
 * `value` is `initial` until what was kept is read.
 */
export function useTraceDraft<Value>(
  field: string,
  initial: Value,
  read: (kept: unknown) => Value | null,
) {
  const traceId = useTraceContext((context) => context.record.id);
  const { kept, ready, save, clear } = useDraft<Value>(`trace:${traceId}:${field}`, read);
  const [typed, setTyped] = useState<Value | null>(null);
  useEffect(() => {
    if (typed !== null) save(typed);
  }, [typed, save]);
  return { value: typed ?? kept ?? initial, ready, set: setTyped, clear };
}
