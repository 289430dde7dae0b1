import { createContext, useContext, useMemo, type ReactNode } from 'react';

/** Lets a tap through unless it follows the last one too closely. */
export interface TapGuard {
  allows: (milliseconds: number) => boolean;
}

/**
 * One guard serves a whole screen: after an answer the next question stands in the same place, and the second half of
 * a double tap must not answer it.
 */
export function createTapGuard(pause: number): TapGuard {
  let last = Number.NEGATIVE_INFINITY;
  return {
    allows: (now) => {
      if (now - last < pause) return false;
      last = now;
      return true;
    },
  };
}

const PAUSE = 400;

const TapGuardContext = createContext<TapGuard | null>(null);

export function TapGuardProvider({ pause = PAUSE, children }: TapGuardProviderProps) {
  const guard = useMemo(() => createTapGuard(pause), [pause]);
  return <TapGuardContext value={guard}>{children}</TapGuardContext>;
}

interface TapGuardProviderProps {
  pause?: number;
  children: ReactNode;
}

/** Wraps what a tap does, so that the second half of a double tap does nothing. */
export function useGuardedTap(onTap: () => void): () => void {
  const guard = useContext(TapGuardContext);
  return () => {
    if (!guard || guard.allows(performance.now())) onTap();
  };
}
