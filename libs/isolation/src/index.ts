export { ANOTHER_SHORT_FACTOR, believe } from './belief';
export { closingSeconds, pointsOf, powerUpSeconds } from './costs';
export { createPlanner, plan } from './planner';
export type { PlannerOptions } from './planner';
export { DEFAULT_TIMING } from './timing';
export type * from './types';
