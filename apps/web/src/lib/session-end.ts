const listeners = new Set<() => void>();

/** Told when the server says that this device is no longer signed in. */
export const sessionEnd = {
  announce: () => {
    for (const listener of listeners) listener();
  },
  subscribe: (listener: () => void) => {
    listeners.add(listener);
    return () => {
      listeners.delete(listener);
    };
  },
};
