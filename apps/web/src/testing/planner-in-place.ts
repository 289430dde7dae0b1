import type { PlannerClient } from '../lib/planner';
import { answerCall } from '../lib/planner/planner-calls';

/** The real planner without a worker, which jsdom has not. */
export const plannerInPlace: PlannerClient = {
  ask: async (name, ...args) => answerCall(name, args),
};
