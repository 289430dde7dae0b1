import { createContext, useContext } from 'react';
import type { PlannerClient } from './planner-calls';

/** The planner of this program: its workers in a browser, one that answers in place in tests. */
export const PlannerContext = createContext<PlannerClient | null>(null);

export function usePlanner(): PlannerClient {
  const planner = useContext(PlannerContext);
  if (!planner) throw new Error('usePlanner is used outside of a PlannerContext.');
  return planner;
}
