import type { PartUsed } from '@lampwright/trace';
import type { TraceWords } from './use-trace-words';

/** "2 × Pigtail, 1 × Grommet". */
export function partsWords(parts: readonly PartUsed[], t: TraceWords): string {
  return parts.map(({ name, quantity }) => t('signed.part', { name, quantity })).join(', ');
}
