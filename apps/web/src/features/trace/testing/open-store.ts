import type { TraceRecord } from '@lampwright/trace';
import type { Keeper } from '../store/outbox';
import type { TraceApi } from '../store/trace-api';
import { TraceStore } from '../store/trace-store';

/** A store on a clock and ids of its own; what waits to be tried again is in `retries`. */
export async function openStore(api: TraceApi, keeper: Keeper, record: TraceRecord) {
  let made = 0;
  const retries: (() => void)[] = [];
  const run = crypto.randomUUID().slice(0, 8);
  const store = await TraceStore.open(
    {
      api,
      keeper,
      device: 'tablet',
      person: 'person-1',
      newId: () => `${run}-0000-7000-8000-${String((made += 1)).padStart(12, '0')}`,
      now: () => new Date('2026-11-02T09:00:00.000Z'),
      later: (retry) => {
        retries.push(retry);
        return () => retries.splice(retries.indexOf(retry), 1);
      },
    },
    { record },
  );
  return { store, retries };
}
