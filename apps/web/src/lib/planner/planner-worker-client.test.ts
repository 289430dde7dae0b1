import type { PlannerRequest } from './planner-messages';
import { createWorkerClient } from './planner-worker-client';
import type { PlannerPort } from './worker-lane';

interface FakePort extends PlannerPort {
  asked: PlannerRequest[];
  ended: boolean;
}

/** Workers that only take notes. */
function fakeWorkers(refused = 0) {
  const started: FakePort[] = [];
  let toRefuse = refused;
  const start = () => {
    if (toRefuse > 0) {
      toRefuse -= 1;
      throw new Error('no workers here');
    }
    const port: FakePort = {
      asked: [],
      ended: false,
      postMessage: (request) => void port.asked.push(request),
      terminate: () => void (port.ended = true),
      onmessage: null,
      onerror: null,
    };
    started.push(port);
    return port;
  };
  return { started, client: createWorkerClient(start) };
}

/** Answers the newest request of a worker. */
const respond = (port: FakePort | undefined, data: { value: unknown } | { error: string }) =>
  port?.onmessage?.({ data: { id: port.asked.at(-1)!.id, ...data } } as MessageEvent);

const stepsAsked = (port: FakePort | undefined) => port?.asked.map(({ args }) => args.at(-1));
const question = {} as never;

describe('a planner in workers', () => {
  it('asks one thing after the other and gives every answer to who asked for it', async () => {
    const { started, client } = fakeWorkers();
    const one = client.ask('advise', [question, 1]);
    const two = client.ask('advise', [question, 2]);
    expect(stepsAsked(started[0])).toEqual([1]);
    respond(started[0], { value: 'first' });
    expect(stepsAsked(started[0])).toEqual([1, 2]);
    respond(started[0], { value: 'second' });
    expect(await Promise.all([one, two])).toEqual(['first', 'second']);
    expect(started).toHaveLength(1);
  });

  it('never lets a long thought stand before a quick answer', () => {
    const { started, client } = fakeWorkers();
    void client.ask('advise', [question, 9], { background: true });
    void client.ask('advise', [question, 1]);
    expect(started.map(stepsAsked)).toEqual([[9], [1]]);
  });

  it('takes out of the line what nobody wants any more', async () => {
    const { started, client } = fakeWorkers();
    const leaving = new AbortController();
    void client.ask('advise', [question, 1]);
    const unwanted = client.ask('advise', [question, 2], { signal: leaving.signal });
    void client.ask('advise', [question, 3]);
    leaving.abort();
    await expect(unwanted).rejects.toBe(leaving.signal.reason);
    respond(started[0], { value: 'first' });
    expect(stepsAsked(started[0])).toEqual([1, 3]);
  });

  it('does not ask at all what nobody wants to begin with', async () => {
    const { started, client } = fakeWorkers();
    const unwanted = client.ask('advise', [question, 1], { signal: AbortSignal.abort() });
    await expect(unwanted).rejects.toThrow();
    expect(started).toHaveLength(0);
  });

  it('throws away a quick answer that nobody wants, and breaks a long thought off', async () => {
    const { started, client } = fakeWorkers();
    const leaving = new AbortController();
    const { signal } = leaving;
    const quick = client.ask('advise', [question, 1], { signal });
    const long = client.ask('advise', [question, 9], { signal, background: true });
    const next = client.ask('advise', [question, 2]);
    leaving.abort();
    await expect(quick).rejects.toBe(signal.reason);
    await expect(long).rejects.toBe(signal.reason);
    expect(started.map(({ ended }) => ended)).toEqual([false, true]);
    respond(started[0], { value: 'unwanted' });
    respond(started[0], { value: 'wanted' });
    expect(await next).toBe('wanted');
    void client.ask('advise', [question, 8], { background: true });
    expect(stepsAsked(started[2])).toEqual([8]);
  });

  it('tells who asked why there is no answer', async () => {
    const { started, client } = fakeWorkers();
    const asked = client.ask('advise', [question, 1]);
    respond(started[0], { error: 'no probability is above 0' });
    await expect(asked).rejects.toThrow('no probability is above 0');
  });

  it('tells who asked when the worker dies, and starts another for the next', async () => {
    const { started, client } = fakeWorkers();
    const asked = client.ask('advise', [question, 1]);
    void client.ask('advise', [question, 2]);
    started[0]?.onerror?.({ message: '' } as ErrorEvent);
    await expect(asked).rejects.toThrow('did not start');
    expect(stepsAsked(started[1])).toEqual([2]);
  });

  it('tells who asked when no worker can be had, and tries again for the next', async () => {
    const { started, client } = fakeWorkers(1);
    await expect(client.ask('advise', [question, 1])).rejects.toThrow('no workers here');
    void client.ask('advise', [question, 2]);
    expect(stepsAsked(started[0])).toEqual([2]);
  });

  it('starts a worker before it is asked anything, and only one', () => {
    const { started, client } = fakeWorkers();
    client.warm();
    client.warm();
    void client.ask('advise', [question, 1]);
    expect(started).toHaveLength(1);
  });
});
