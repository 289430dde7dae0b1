import { z } from 'zod';

const signDraft = z.object({
  name: z.string().nullable(),
  cause: z.string().nullable(),
  correction: z.string().nullable(),
  minutes: z.number().nullable(),
});

/** What was changed before signing; `null` where what the record says still stands. */
export type SignDraft = z.infer<typeof signDraft>;

export const untouched: SignDraft = { name: null, cause: null, correction: null, minutes: null };

export function readSignDraft(kept: unknown): SignDraft | null {
  const read = signDraft.safeParse(kept);
  return read.success ? read.data : null;
}
