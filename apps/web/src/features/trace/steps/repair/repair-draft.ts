import { z } from 'zod';

const repairDraft = z.object({
  /** Ids of the short lists; `other` for own words. */
  cause: z.string().nullable(),
  causeWords: z.string(),
  correction: z.string().nullable(),
  correctionWords: z.string(),
  parts: z.array(z.object({ name: z.string(), quantity: z.number() })),
  note: z.string(),
});

/** What has been said so far of a repair. */
export type RepairDraft = z.infer<typeof repairDraft>;

export const emptyRepair: RepairDraft = {
  cause: null,
  causeWords: '',
  correction: null,
  correctionWords: '',
  parts: [],
  note: '',
};

export function readRepairDraft(kept: unknown): RepairDraft | null {
  const read = repairDraft.safeParse(kept);
  return read.success ? read.data : null;
}
