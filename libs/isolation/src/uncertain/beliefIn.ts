import type { Belief, Hunt, Reading } from '../types';
import { standingOf } from './standing';

/**
 * What a hunt knows, repairs and looked-over sections counted in: of the shorts that are left, if any is; how likely
 * none is (above 0 only after a repair with no overload since); and the readings that still say anything.
 */
export function beliefIn(hunt: Hunt): { belief: Belief; noneLeft: number; readings: Reading[] } {
  const { belief, noneLeft, readings } = standingOf(hunt);
  return { belief, noneLeft, readings };
}
