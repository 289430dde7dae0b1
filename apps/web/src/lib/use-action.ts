import { useCallback, useRef, useState } from 'react';

export type Outcome<T> = { ok: true; value: T } | { ok: false; error: unknown };

/**
 * Runs a change on the server by hand. `run` never throws: it answers with the value or the error, which also stands
 * in `error` until the next run. A second tap while the first is on its way is ignored.
 */
export function useAction<Args extends unknown[], T>(work: (...args: Args) => Promise<T>) {
  const [busy, setBusy] = useState(false);
  const [error, setError] = useState<unknown>(null);
  const running = useRef(false);

  const run = useCallback(
    async (...args: Args): Promise<Outcome<T> | null> => {
      if (running.current) return null;
      running.current = true;
      setBusy(true);
      setError(null);
      try {
        return { ok: true, value: await work(...args) };
      } catch (reason) {
        setError(reason);
        return { ok: false, error: reason };
      } finally {
        running.current = false;
        setBusy(false);
      }
    },
    [work],
  );
  return { run, busy, error, reset: useCallback(() => setError(null), []) };
}
