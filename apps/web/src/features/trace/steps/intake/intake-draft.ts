import { z } from 'zod';

/** What has been said so far of the complaint and the feed. */
const intakeDraft = z.object({
  complaint: z.string().nullable(),
  words: z.string(),
  circuits: z.array(z.string()),
  feedKind: z.enum(['seriesLamp', 'tester', 'breaker', 'fuse', 'ohmmeter']).nullable(),
  breakerType: z.union([z.literal(1), z.literal(2), z.literal(3)]).nullable(),
  atHand: z.boolean().nullable(),
});

export type IntakeDraft = z.infer<typeof intakeDraft>;

export const emptyIntake: IntakeDraft = {
  complaint: null,
  words: '',
  circuits: [],
  feedKind: null,
  breakerType: null,
  atHand: null,
};

export function readIntakeDraft(kept: unknown): IntakeDraft | null {
  const read = intakeDraft.safeParse(kept);
  return read.success ? read.data : null;
}
