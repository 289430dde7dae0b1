import type { PlannerClient } from './planner-calls';
import { createWorkerClient } from './planner-worker-client';

/** The planner in workers of this browser, which start when they are first needed. */
export function plannerInWorkers(): PlannerClient {
  return createWorkerClient(
    () => new Worker(new URL('./planner.worker.ts', import.meta.url), { type: 'module' }),
  );
}
