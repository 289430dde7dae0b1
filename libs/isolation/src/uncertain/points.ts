import type { SeparablePoint } from '@lampwright/harness';
import { walkSeconds } from '../costs';
import type { Standing } from './standing';

/** A point with something in question on both sides of it. */
export interface UsefulPoint {
  /** The section that it feeds. */
  section: number;
  point: SeparablePoint;
  isOpen: boolean;
  /** Seconds of opening it now and closing it once some day; 0 while it is open. */
  hands: number;
  walk: number;
}

/** The points of a hunt, sorted by what the next power-up can do with them. */
export interface HuntPoints {
  useful: UsefulPoint[];
  /** Open points with all that is in question beyond them: the next power-up has them closed. */
  blocking: SeparablePoint[];
}

/** Sections at less than this are not in question here: no power-up is made for them. */
const WORTH_ASKING = 1e-6;

/** Sorts the points. O(sections + open). */
export function pointsOfHunt({ hunt, tree, belief }: Standing): HuntPoints {
  const { timing } = hunt;
  const open = new Set(hunt.open);
  const barred = new Set(hunt.barred);
  const { sections } = tree;
  const beyond = belief.probabilities.map(
    (probability) => (probability > WORTH_ASKING ? 1 : 0) as number,
  );
  for (const { index, parent } of sections.toReversed()) {
    if (parent !== null) beyond[parent] = (beyond[parent] ?? 0) + (beyond[index] ?? 0);
  }
  const all = beyond[0] ?? 0;
  const useful: UsefulPoint[] = [];
  const blocking: SeparablePoint[] = [];
  for (const { index, point } of sections) {
    const count = beyond[index] ?? 0;
    if (!point || count === 0 || barred.has(point.partId)) continue;
    const isOpen = open.has(point.partId);
    if (count === all) {
      if (isOpen) blocking.push(point);
      continue;
    }
    const hands = isOpen ? 0 : point.openSeconds + point.closeSeconds;
    useful.push({ section: index, point, isOpen, hands, walk: walkSeconds(point, timing) });
  }
  return { useful, blocking };
}
