import { z } from 'zod';
import type { TraceRecord } from '../record';
import { id, listOf, name, time } from './values';

const seconds = z.number().min(0).max(86_400);
const probability = z.number().gt(0).max(1);

/** All of a record but its plan and its events, which have readers of their own. */
export const surroundingsSchema: z.ZodType<
  Omit<TraceRecord, 'plan' | 'events'> & {
    plan: { id: string; revision: number; harness: unknown };
    events: unknown[];
  }
> = z.strictObject({
  format: z.int(),
  id,
  trailer: z.strictObject({
    id,
    unit: name,
    bodyType: z.enum([
      'dryVan',
      'flatbed',
      'pup',
      'containerChassis',
      'refrigerated',
      'carHauler',
      'tank',
      'utility',
    ]),
    secondSources: listOf(z.enum(['battery', 'liftGate', 'refrigeration', 'solar'])),
    abs: z.boolean(),
  }),
  plan: z.strictObject({ id, revision: z.int().min(1), harness: z.unknown() }),
  settings: z.strictObject({
    powerSeconds: seconds,
    walkSecondsPerMetre: seconds,
    powerAlong: z.number().min(-1000).max(1000),
    overloadSeconds: z.strictObject({
      seriesLamp: seconds,
      tester: seconds,
      breaker: seconds,
      fuse: seconds,
      ohmmeter: seconds,
    }),
    overloadLimit: z.int().min(1).max(100),
    detection: z.strictObject({ steady: probability, comesAndGoes: probability }),
  }),
  author: id,
  openedAt: time,
  // A day's work has under two hundred.
  events: z.array(z.unknown()).max(10_000),
});
