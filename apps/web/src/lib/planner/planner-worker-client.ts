import type { PlannerAnswer, PlannerArguments, PlannerCall, PlannerClient } from './planner-calls';
import type { PlannerRequest, PlannerResponse } from './planner-messages';

/** As much of a worker as the client needs. */
export interface PlannerPort {
  postMessage(request: PlannerRequest): void;
  onmessage: ((event: MessageEvent<PlannerResponse>) => void) | null;
  onerror: ((event: ErrorEvent) => void) | null;
}

interface Waiting {
  resolve(value: unknown): void;
  reject(error: Error): void;
}

/** A planner in a worker, started with its first call. Calls are answered in the order they are made. */
export function createWorkerClient(start: () => PlannerPort): PlannerClient {
  const waiting = new Map<number, Waiting>();
  let port: PlannerPort | null = null;
  let last = 0;

  const opened = (): PlannerPort => {
    const made = start();
    made.onmessage = ({ data }) => {
      const asked = waiting.get(data.id);
      waiting.delete(data.id);
      if ('error' in data) asked?.reject(new Error(data.error));
      else asked?.resolve(data.value);
    };
    // The worker itself could not be loaded or died: whoever waits is told, and the next call starts another.
    made.onerror = ({ message }) => {
      port = null;
      const all = [...waiting.values()];
      waiting.clear();
      all.forEach(({ reject }) => reject(new Error(message || 'The planner did not start.')));
    };
    return made;
  };

  return {
    ask: <Name extends PlannerCall>(name: Name, ...args: PlannerArguments<Name>) =>
      new Promise<PlannerAnswer<Name>>((resolve, reject) => {
        port ??= opened();
        last += 1;
        waiting.set(last, {
          resolve: (value) => resolve(value as PlannerAnswer<Name>),
          reject,
        });
        port.postMessage({ id: last, name, args });
      }),
  };
}
