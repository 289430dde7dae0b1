import type { Hunt, HuntPlan, HuntPlanner } from '../types';

/** More plans than this are not kept. */
const MOST_KEPT = 50_000;

/**
 * A planner that plans the same standing once: for many plays of hunts that start alike, on one tree with one timing.
 * Most of them part only after a few readings.
 */
export function remembered(planner: HuntPlanner): HuntPlanner {
  const kept = new Map<string, HuntPlan>();
  return {
    plan: (hunt) => {
      const key = keyOf(hunt);
      const before = kept.get(key);
      if (before) return before;
      const plan = planner.plan(hunt);
      if (kept.size < MOST_KEPT) kept.set(key, plan);
      return plan;
    },
  };
}

function keyOf({ readings, mended, lookedOver, open }: Hunt): string {
  return JSON.stringify([readings, mended, lookedOver, open]);
}
