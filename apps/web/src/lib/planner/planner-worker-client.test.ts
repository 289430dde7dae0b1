import type { PlannerRequest } from './planner-messages';
import { createWorkerClient, type PlannerPort } from './planner-worker-client';

/** Workers that only take notes. */
function fakeWorkers() {
  const started: (PlannerPort & { asked: PlannerRequest[] })[] = [];
  const start = () => {
    const asked: PlannerRequest[] = [];
    const port = {
      asked,
      postMessage: (request: PlannerRequest) => void asked.push(request),
      onmessage: null,
      onerror: null,
    };
    started.push(port);
    return port;
  };
  return { started, client: createWorkerClient(start) };
}

const respond = (port: PlannerPort | undefined, data: unknown) =>
  port?.onmessage?.({ data } as MessageEvent);

describe('a planner in a worker', () => {
  it('gives every answer to who asked for it, in whatever order they come', async () => {
    const { started, client } = fakeWorkers();
    const one = client.ask('plan', {} as never, 1);
    const two = client.ask('plan', {} as never, 2);
    const [port] = started;
    expect(port?.asked.map(({ args }) => args[1])).toEqual([1, 2]);
    respond(port, { id: port?.asked[1]?.id, value: 'second' });
    respond(port, { id: port?.asked[0]?.id, value: 'first' });
    expect(await Promise.all([one, two])).toEqual(['first', 'second']);
    expect(started).toHaveLength(1);
  });

  it('tells who asked why there is no answer', async () => {
    const { started, client } = fakeWorkers();
    const asked = client.ask('plan', {} as never, 1);
    respond(started[0], { id: started[0]?.asked[0]?.id, error: 'no probability is above 0' });
    await expect(asked).rejects.toThrow('no probability is above 0');
  });

  it('tells everybody when the worker dies, and starts another for the next', async () => {
    const { started, client } = fakeWorkers();
    const asked = client.ask('plan', {} as never, 1);
    started[0]?.onerror?.({ message: '' } as ErrorEvent);
    await expect(asked).rejects.toThrow('did not start');
    void client.ask('plan', {} as never, 2);
    expect(started).toHaveLength(2);
  });
});
