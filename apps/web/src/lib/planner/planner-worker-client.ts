import type {
  AskOptions,
  PlannerAnswer,
  PlannerArguments,
  PlannerCall,
  PlannerClient,
} from './planner-calls';
import { WorkerLane, type PlannerPort } from './worker-lane';

/**
 * A planner in two workers: one for what a person waits for, one for what only sharpens it, so that a long thought
 * never stands before a quick answer. A long thought that nobody wants any more is broken off.
 */
export function createWorkerClient(start: () => PlannerPort): PlannerClient {
  const foreground = new WorkerLane(start, false);
  const background = new WorkerLane(start, true);
  let last = 0;
  return {
    ask: <Name extends PlannerCall>(
      name: Name,
      args: PlannerArguments<Name>,
      { background: later = false, signal }: AskOptions = {},
    ) => {
      last += 1;
      const lane = later ? background : foreground;
      const answer = lane.ask({ id: last, name, args }, signal);
      return answer as Promise<PlannerAnswer<Name>>;
    },
    warm: () => foreground.warm(),
  };
}
