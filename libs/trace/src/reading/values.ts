import type { PlaceRef } from '@lampwright/harness';
import { z } from 'zod';
import type { Feed } from '../feed';

/** Longest text a person may leave, in characters. Ours: a page of writing, and no more than a report can carry. */
const LONGEST_TEXT = 2000;
const LONGEST_NAME = 200;
/** Most entries of one list inside an event. Ours: far above any trailer. */
const MOST_ENTRIES = 500;

export const id = z.string().min(1).max(LONGEST_NAME);
export const name = z.string().max(LONGEST_NAME);
export const text = z.string().max(LONGEST_TEXT);
export const time = z.iso.datetime({ offset: true });
/** No lighting circuit of a trailer carries more; a typing mistake does. */
export const amps = z.number().min(0).max(1000);

export function listOf<Item extends z.ZodType>(item: Item) {
  return z.array(item).max(MOST_ENTRIES);
}

export const place: z.ZodType<PlaceRef> = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('part'), id, half: z.enum(['feed', 'load']).optional() }),
  z.strictObject({ kind: z.literal('run'), id }),
]);

export const feed: z.ZodType<Feed> = z
  .strictObject({
    kind: z.enum(['seriesLamp', 'tester', 'breaker', 'fuse', 'ohmmeter']),
    breakerType: z.literal([1, 2, 3]).optional(),
    atHand: z.boolean(),
  })
  .refine((value) => value.breakerType === undefined || value.kind === 'breaker', {
    path: ['breakerType'],
  });

export const partsUsed = listOf(
  z.strictObject({ name: name.min(1), quantity: z.number().min(0).max(100_000) }),
);
