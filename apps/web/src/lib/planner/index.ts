export type { Advised, CircuitForecast, PlannerClient } from './planner-calls';
export { PlannerContext, usePlanner } from './planner-context';
export { plannerInWorkers } from './planner-in-workers';
