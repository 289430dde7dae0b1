import { useCallback, useEffect, useRef, useState } from 'react';
import { storage } from './storage';

const keyOf = (name: string) => `draft:${name}`;

/** A draft that is typed into outlives a failed request, a reload and a closed lid. */
export interface Draft<T> {
  /** What was kept, once it is read; `null` where there was nothing. */
  kept: T | null;
  /** False while the device's storage is being read; a form waits for it. */
  ready: boolean;
  /** False once the device refused to keep the draft. */
  safe: boolean;
  save: (value: T) => void;
  /** Forgets the draft, once the server has it. */
  clear: () => void;
}

/**
 * Keeps what is typed under `name`, one write behind the last key. `read` turns what was kept, perhaps by an older
 * version, into a draft, or `null` to leave it.
 */
export function useDraft<T>(name: string, read: (kept: unknown) => T | null): Draft<T> {
  const [state, setState] = useState<{ name: string; kept: T | null } | null>(null);
  const [safe, setSafe] = useState(true);
  const reader = useRef(read);
  /** Writes go one after another, so that an old one cannot land after a new one. */
  const queue = useRef<Promise<unknown>>(Promise.resolve());

  useEffect(() => {
    let current = true;
    storage.read(keyOf(name)).then(
      (kept) => {
        if (current) setState({ name, kept: kept === undefined ? null : reader.current(kept) });
      },
      () => {
        if (!current) return;
        setSafe(false);
        setState({ name, kept: null });
      },
    );
    return () => {
      current = false;
    };
  }, [name]);

  const enqueue = useCallback((work: () => Promise<void>) => {
    queue.current = queue.current.then(work).then(
      () => setSafe(true),
      () => setSafe(false),
    );
  }, []);

  const save = useCallback(
    (value: T) => enqueue(() => storage.write(keyOf(name), value)),
    [enqueue, name],
  );
  const clear = useCallback(() => enqueue(() => storage.remove(keyOf(name))), [enqueue, name]);
  const ready = state?.name === name;
  return { kept: ready ? state.kept : null, ready, safe, save, clear };
}
