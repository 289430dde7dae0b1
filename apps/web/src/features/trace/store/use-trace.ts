import type { TraceRecord } from '@lampwright/trace';
import { useCallback, useEffect, useState } from 'react';
import { uuidv7 } from 'uuidv7';
import { useAccount } from '../../../lib/session-context';
import { storage } from '../../../lib/storage';
import { deviceId } from './device-id';
import { loadTrace } from './load-trace';
import { traceApi } from './trace-api';
import { TraceStore } from './trace-store';

export type LoadedTrace =
  | { state: 'loading' }
  | { state: 'failed'; error: unknown }
  | { state: 'reading'; record: TraceRecord }
  | { state: 'writing'; store: TraceStore };

/** Opens a trace and keeps it open while its screen is. Waiting events are sent on start, on a signal, and on return. */
export function useTrace(id: string): { trace: LoadedTrace; retry: () => void } {
  const { id: person } = useAccount();
  const [attempt, setAttempt] = useState(0);
  const [loaded, setLoaded] = useState<{ key: string; trace: LoadedTrace } | null>(null);
  const key = `${id}:${person}:${attempt}`;

  useEffect(() => {
    let current = true;
    let store: TraceStore | null = null;
    const show = (trace: LoadedTrace) => {
      if (current) setLoaded({ key, trace });
    };
    const open = async () => {
      const { record, writable } = await loadTrace(id, { api: traceApi, keeper: storage });
      if (!current) return;
      if (!writable) return show({ state: 'reading', record });
      const opened = await TraceStore.open(
        {
          api: traceApi,
          keeper: storage,
          device: deviceId(),
          person,
          newId: uuidv7,
          now: () => new Date(),
          later: (run, milliseconds) => {
            const timer = setTimeout(run, milliseconds);
            return () => clearTimeout(timer);
          },
        },
        { record },
      );
      if (!current) return opened.close();
      store = opened;
      show({ state: 'writing', store: opened });
    };
    open().catch((error: unknown) => show({ state: 'failed', error }));

    const send = () => void store?.send();
    const sendIfSeen = () => {
      if (document.visibilityState === 'visible') send();
    };
    window.addEventListener('online', send);
    document.addEventListener('visibilitychange', sendIfSeen);
    return () => {
      current = false;
      store?.close();
      window.removeEventListener('online', send);
      document.removeEventListener('visibilitychange', sendIfSeen);
    };
  }, [id, person, key]);

  const retry = useCallback(() => setAttempt((count) => count + 1), []);
  return { trace: loaded?.key === key ? loaded.trace : { state: 'loading' }, retry };
}
