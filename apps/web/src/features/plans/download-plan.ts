import type { PlanDto } from '@lampwright/contracts';

/** Hands the plan document to the person as a file that can be imported again. */
export function downloadPlan({ name, revision, harness }: PlanDto): void {
  const file = new Blob([`${JSON.stringify(harness, null, 2)}\n`], { type: 'application/json' });
  const address = URL.createObjectURL(file);
  const link = document.createElement('a');
  link.href = address;
  link.download = `${name.replace(/[^\p{L}\p{N}]+/gu, '-').toLowerCase()}-r${revision}.json`;
  link.click();
  URL.revokeObjectURL(address);
}
