import type { EntityManager } from '@mikro-orm/better-sqlite';
import { demoTraces } from '@lampwright/demo';
import { storeRecord } from '../traces/store-record';

/** Adds the finished traces of the demo yard, which must be there. They are played anew: about a second of work. */
export async function seedDemoTraces(em: EntityManager, now: Date): Promise<void> {
  for (const record of demoTraces()) await storeRecord(em, record, now);
  await em.flush();
}
