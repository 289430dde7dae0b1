import { createContext, useContext, useMemo, type MouseEvent, type ReactNode } from 'react';

/** Where and when a finger came down, in CSS pixels and milliseconds. */
interface Tap {
  x: number;
  y: number;
  at: number;
}

/** Lets a tap through unless it is the second half of a double tap. */
export interface TapGuard {
  allows: (tap: Tap) => boolean;
}

/** A glove that bounces comes down within a finger's width of where it was. */
const SAME_PLACE = 48;

/**
 * One guard serves a whole screen: after an answer the next question stands in the same place, and the second half of
 * a double tap must not answer it. Two taps in two places are two answers, however quick.
 */
export function createTapGuard(pause: number): TapGuard {
  let last: Tap = { x: 0, y: 0, at: Number.NEGATIVE_INFINITY };
  return {
    allows: (tap) => {
      const near = Math.hypot(tap.x - last.x, tap.y - last.y) < SAME_PLACE;
      if (near && tap.at - last.at < pause) return false;
      last = tap;
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
export function useGuardedTap(onTap: () => void): (event: MouseEvent) => void {
  const guard = useContext(TapGuardContext);
  return ({ clientX, clientY }) => {
    if (!guard || guard.allows({ x: clientX, y: clientY, at: performance.now() })) onTap();
  };
}
