import { createContext, useContext, useEffect, useState, type ReactNode } from 'react';
import { usePlanner } from '../../../lib/planner';
import { Adviser } from './adviser';

const AdviserContext = createContext<Adviser | null>(null);

/** Keeps what the planner said for as long as the screen of one trace stands. */
export function AdviserProvider({ children }: { children: ReactNode }) {
  const planner = usePlanner();
  const [adviser] = useState(() => new Adviser(planner, (error) => reportError(error)));
  // Further in, between two trailers, there may be no signal to fetch the worker over.
  useEffect(() => planner.warm(), [planner]);
  return <AdviserContext value={adviser}>{children}</AdviserContext>;
}

export function useAdviser(): Adviser {
  const adviser = useContext(AdviserContext);
  if (!adviser) throw new Error('useAdviser is used outside of an AdviserProvider.');
  return adviser;
}
