import type { PlannerClient } from '../lib/planner';
import { answerCall } from '../lib/planner/planner-calls';

/** The real planner without a worker, which jsdom has not. */
export const plannerInPlace: PlannerClient = {
  ask: async (name, args, { signal } = {}) => {
    // As through a worker: nothing comes back at once, and arguments and answers are copies.
    await null;
    signal?.throwIfAborted();
    return structuredClone(answerCall(name, structuredClone(args)));
  },
  warm: () => undefined,
};
