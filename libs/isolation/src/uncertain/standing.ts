import { energisedSections, type SectionTree } from '@lampwright/harness';
import { ANOTHER_SHORT_FACTOR, believe, weighSets, type WeighedSets } from '../belief';
import type { Belief, Hunt, Reading } from '../types';
import { speaking } from './speaking';

/** From here on a probability stands for certainty, after rounding. */
const CERTAIN = 1 - 1e-9;

/** Keeps a doubt of exactly one in twenty from being too much by rounding. */
const ROUNDING = 1e-12;

/** Where a hunt stops when its readings may miss. Common practice, no source. */
export const STOPS_AT = 0.95;

/** What is known in a hunt. */
export interface Standing {
  hunt: Hunt;
  detection: number;
  /** Whether more than one short may be left. */
  several: boolean;
  /** The tree with what was mended and looked over taken out. */
  tree: SectionTree;
  /** The readings that still count. */
  readings: Reading[];
  /** Of the shorts that are left, if any is. */
  belief: Belief;
  sets: WeighedSets;
  /** Probability that no short is left: above 0 only after a repair with no overload since. */
  noneLeft: number;
  /** Whether the circuit has held often enough since the last repair that a short left would have shown. */
  proven: boolean;
  /** The probability that is enough. */
  stopsAt: number;
}

/** Works out what is known. As dear as two beliefs. */
export function standingOf(hunt: Hunt): Standing {
  const { options, mended = [], lookedOver = [] } = hunt;
  const { detection = 1, maxFaults = 1 } = options;
  const readings = speaking(hunt.tree, hunt.readings, mended);
  const gone = new Map(lookedOver.map((section) => [section, 0]));
  for (const { section, again = 0 } of mended) gone.set(section, again);
  const tree = {
    ...hunt.tree,
    sections: hunt.tree.sections.map((section) => ({
      ...section,
      probability: section.probability * (gone.get(section.index) ?? 1),
    })),
  };
  const mayBeNone = mended.length > 0 && readings.every(({ outcome }) => outcome === 'holds');
  const left = maxFaults - mended.length;
  // More shorts than were thought possible: what overloads still has to be found.
  const now = { detection, maxFaults: Math.max(1, left) };
  const sets = weighSets(tree, readings, now);
  const some = left > 0 || !mayBeNone ? ANOTHER_SHORT_FACTOR * sets.total : 0;
  const stopsAt = hunt.confidence ?? (detection < 1 ? STOPS_AT : CERTAIN);
  return {
    hunt,
    detection,
    several: now.maxFaults > 1,
    tree,
    readings,
    belief: believe(tree, readings, now),
    sets,
    noneLeft: mayBeNone ? 1 / (1 + some) : 0,
    proven: provenClear(hunt, tree, detection, stopsAt),
    stopsAt,
  };
}

/**
 * Whether a short that is left would have shown by now: with everything that can be short energised, the circuit has
 * held so often since the last repair that all of these readings miss one with no more than the doubt allowed.
 */
function provenClear(
  { readings, mended = [] }: Hunt,
  tree: SectionTree,
  detection: number,
  stopsAt: number,
): boolean {
  const since = mended.reduce((latest, { after }) => Math.max(latest, after), 0);
  const held = readings.slice(since).filter(({ open, outcome }) => {
    if (outcome === 'overload') return false;
    const energised = energisedSections(tree, open);
    return tree.sections.every(({ index, probability }) => probability === 0 || energised[index]);
  });
  return held.length > 0 && (1 - detection) ** held.length <= 1 - stopsAt + ROUNDING;
}
