import { ApiError } from '../../../lib/api-error';
import { StorageError } from '../../../lib/storage';
import { contextOf, stepOf, type TraceEventBody } from '@lampwright/trace';
import { newRecord } from '@lampwright/trace/testing';
import { fakeTraceServer } from '../testing/fake-trace-server';
import { memoryKeeper } from '../testing/memory-keeper';
import { openStore } from '../testing/open-store';
import type { TraceStore } from './trace-store';

const intake: TraceEventBody = {
  type: 'intake.stated',
  complaint: 'Fuse blows',
  circuits: ['tail'],
  feed: { kind: 'seriesLamp', atHand: true },
};
const tick: TraceEventBody = { type: 'caution.ticked', caution: 'chocks' };

const log = (store: TraceStore) => store.getActor().getSnapshot().context.log;
const settled = (store: TraceStore) => store.send();

describe('TraceStore', () => {
  it('writes an event to the device before it is sent', async () => {
    const record = newRecord();
    const server = fakeTraceServer(record);
    const keeper = memoryKeeper();
    const { store } = await openStore(server.api, keeper, record);
    const order: string[] = [];
    const append = vi.spyOn(server.api, 'append').mockImplementation(async () => {
      order.push(
        `sent with ${(keeper.kept.get(`outbox:1:${record.id}`) as unknown[]).length} kept`,
      );
      throw new TypeError('no route');
    });
    await store.record(intake);
    await settled(store);
    expect(append).toHaveBeenCalled();
    expect(order[0]).toBe('sent with 1 kept');
  });

  it('sends in order, and says that all is sent', async () => {
    const record = newRecord();
    const server = fakeTraceServer(record);
    const { store } = await openStore(server.api, memoryKeeper(), record);
    await Promise.all([store.record(intake), store.record(tick)]);
    await settled(store);
    expect(server.record().events.map(({ type, seq }) => [type, seq])).toEqual([
      ['intake.stated', 1],
      ['caution.ticked', 2],
    ]);
    expect(store.getSync()).toMatchObject({ waiting: 0, sending: false, failure: null });
  });

  it('keeps what was recorded without a signal over a reload, and sends it then', async () => {
    const record = newRecord();
    const server = fakeTraceServer(record);
    const keeper = memoryKeeper();
    server.down = new TypeError('no route');
    const before = await openStore(server.api, keeper, record);
    await before.store.record(intake);
    await settled(before.store);
    expect(before.store.getSync()).toMatchObject({ waiting: 1, failure: 'offline' });
    before.store.close();

    const after = await openStore(server.api, keeper, record);
    expect(stepOf(log(after.store))).toBe('makeSafe');
    await settled(after.store);
    expect(server.record().events).toHaveLength(0);
    server.down = null;
    await settled(after.store);
    expect(server.record().events).toHaveLength(1);
    expect(after.store.getSync().waiting).toBe(0);
  });

  it('tries again by itself after a failure', async () => {
    const record = newRecord();
    const server = fakeTraceServer(record);
    const { store, retries } = await openStore(server.api, memoryKeeper(), record);
    server.down = new TypeError('no route');
    await store.record(intake);
    await settled(store);
    expect(retries).toHaveLength(1);
    server.down = null;
    retries[0]?.();
    await vi.waitFor(() => expect(server.record().events).toHaveLength(1));
  });

  it('takes events that the server already has as sent', async () => {
    const record = newRecord();
    const server = fakeTraceServer(record);
    const keeper = memoryKeeper();
    server.loseAnswer = true;
    const { store } = await openStore(server.api, keeper, record);
    await store.record(intake);
    await settled(store);
    expect(server.record().events).toHaveLength(1);
    expect(store.getSync().waiting).toBe(1);
    await settled(store);
    expect(store.getSync()).toMatchObject({ waiting: 0, refused: [] });
    expect(server.record().events).toHaveLength(1);
  });

  it('folds waiting events once, though the server has them too', async () => {
    const record = newRecord();
    const server = fakeTraceServer(record);
    const keeper = memoryKeeper();
    server.loseAnswer = true;
    const before = await openStore(server.api, keeper, record);
    await before.store.record(intake);
    await settled(before.store);
    before.store.close();
    const after = await openStore(server.api, keeper, server.record());
    expect(log(after.store).record.events).toHaveLength(1);
    expect(log(after.store).skipped).toEqual([]);
  });

  it('shows a refused event and the tail after it, and goes on from what the server has', async () => {
    const record = newRecord();
    const server = fakeTraceServer(record);
    const keeper = memoryKeeper();
    server.down = new TypeError('no route');
    const { store } = await openStore(server.api, keeper, record);
    await store.record(intake);
    await store.record(tick);
    await settled(store);
    // Meanwhile another tablet has stated another complaint.
    const elsewhere = fakeTraceServer(record);
    const other = await openStore(elsewhere.api, memoryKeeper(), record);
    await other.store.record({ ...intake, complaint: 'Said elsewhere' });
    await settled(other.store);
    server.replace(elsewhere.record());
    server.down = null;
    await settled(store);

    const { refused, waiting } = store.getSync();
    expect(waiting).toBe(0);
    expect(refused.map(({ event }) => event.type)).toEqual(['intake.stated', 'caution.ticked']);
    expect(refused[1]?.refusal.reason).toBe('outOfSequence');
    expect(contextOf(log(store)).complaint).toBe('Said elsewhere');
    // The way on: what is said now is taken.
    expect(await store.record(tick)).toBe('recorded');
    await settled(store);
    expect(server.record().events.map(({ type }) => type)).toEqual([
      'intake.stated',
      'caution.ticked',
    ]);

    const again = await openStore(server.api, keeper, server.record());
    expect(again.store.getSync().refused).toHaveLength(2);
    await again.store.forgetRefused();
    expect(again.store.getSync().refused).toEqual([]);
  });

  it('asks for a sign-in when the session is over, and keeps what waits', async () => {
    const record = newRecord();
    const server = fakeTraceServer(record);
    const { store, retries } = await openStore(server.api, memoryKeeper(), record);
    server.down = new ApiError(401, 'sessionEnded', null);
    await store.record(intake);
    await settled(store);
    expect(store.getSync()).toMatchObject({ waiting: 1, failure: 'signIn' });
    expect(retries).toHaveLength(0);
    // Capture goes on.
    expect(await store.record(tick)).toBe('recorded');
  });

  it('does not keep what the rules refuse, and says why', async () => {
    const record = newRecord();
    const server = fakeTraceServer(record);
    const keeper = memoryKeeper();
    const { store } = await openStore(server.api, keeper, record);
    expect(await store.record({ type: 'safety.confirmed' })).toBe('refused');
    expect(store.getSync().problem).toMatchObject({ reason: 'notInThisStep' });
    expect(keeper.kept.size).toBe(0);
    await store.record(intake);
    expect(store.getSync().problem).toBeNull();
  });

  it('records nothing on a device that cannot store it', async () => {
    const record = newRecord();
    const server = fakeTraceServer(record);
    const keeper = memoryKeeper();
    const { store } = await openStore(server.api, keeper, record);
    vi.spyOn(keeper, 'update').mockRejectedValue(new StorageError(new Error('full')));
    expect(await store.record(intake)).toBe('notKept');
    expect(stepOf(log(store))).toBe('intake');
    expect(store.getSync().problem).toBe('notKept');
  });
});
