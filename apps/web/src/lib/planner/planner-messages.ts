import type { PlannerArguments, PlannerCall } from './planner-calls';

/** A call on its way to the worker. */
export interface PlannerRequest<Name extends PlannerCall = PlannerCall> {
  id: number;
  name: Name;
  args: PlannerArguments<Name>;
}

/** Its answer, or why there is none. */
export type PlannerResponse = { id: number } & ({ value: unknown } | { error: string });
