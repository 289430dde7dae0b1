import { energisedSections } from '@lampwright/harness';
import type { Reading } from '../types';
import type { Standing } from './standing';

/** The one short that is hunted now. */
export interface Target {
  /** By section: how likely it is there, summing to 1. */
  shares: number[];
  /** The overload within which it is hunted; `null` where only one short can be left, or nothing overloaded yet. */
  within: Reading | null;
}

/**
 * Of several shorts the hunt is for one within what overloaded: of all overloads, the one that leaves the least in
 * question. O(sections x readings).
 */
export function targetOf({ tree, belief, readings, several }: Standing): Target {
  const { probabilities } = belief;
  let shares = probabilities;
  let within: Reading | null = null;
  let least = Infinity;
  for (const reading of several ? readings : []) {
    if (reading.outcome !== 'overload') continue;
    const energised = energisedSections(tree, reading.open);
    const part = probabilities.map((probability, at) => (energised[at] ? probability : 0));
    const sum = part.reduce((total, each) => total + each, 0);
    if (sum >= least) continue;
    least = sum;
    shares = part;
    within = reading;
  }
  const sum = shares.reduce((total, each) => total + each, 0);
  return { shares: sum > 0 ? shares.map((each) => each / sum) : shares, within };
}
