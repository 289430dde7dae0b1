import { createContext, useContext } from 'react';
import { createWorkerClient } from './planner-worker-client';
import type { PlannerClient } from './planner-calls';

const worker = createWorkerClient(
  () => new Worker(new URL('./planner.worker.ts', import.meta.url), { type: 'module' }),
);

/** The planner in its worker; tests hand in one that answers in place. */
export const PlannerContext = createContext<PlannerClient>(worker);

export function usePlanner(): PlannerClient {
  return useContext(PlannerContext);
}
