export type { CircuitForecast, PlannerClient } from './planner-calls';
export { PlannerContext, usePlanner } from './planner-context';
