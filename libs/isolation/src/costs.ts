import type { PartId, SectionTree, SeparablePoint } from '@lampwright/harness';
import type { Outcome, Timing } from './types';

/** The separable points of one circuit, in section order. O(sections). */
export function pointsOf(tree: SectionTree): SeparablePoint[] {
  return tree.sections.flatMap(({ point }) => (point ? [point] : []));
}

/** Seconds of walking between the switch and a point, there and back. */
export function walkSeconds(point: SeparablePoint, timing: Timing): number {
  return 2 * timing.walkSecondsPerMetre * Math.abs(point.along - timing.powerAlong);
}

/**
 * Seconds of one power-up by its outcome, from the open set that the last step left to the open set that this one
 * wants: opening, closing, one walk to the farthest point touched and back, the power-up, and the overload where one
 * comes. Points of other circuits are known only through `elsewhere`; an id that is in neither costs nothing.
 * O(points + open).
 */
export function powerUpSeconds(
  tree: SectionTree,
  from: readonly PartId[],
  to: readonly PartId[],
  timing: Timing,
  elsewhere: readonly SeparablePoint[] = [],
): Record<Outcome, number> {
  const holds =
    timing.powerSeconds +
    handlingSeconds([...pointsOf(tree), ...elsewhere], new Set(from), new Set(to), timing);
  return { holds, overload: holds + timing.overloadSeconds };
}

/** Seconds of closing everything that is open, with one walk; 0 when nothing is. O(points + open). */
export function closingSeconds(
  tree: SectionTree,
  open: readonly PartId[],
  timing: Timing,
  elsewhere: readonly SeparablePoint[] = [],
): number {
  return handlingSeconds([...pointsOf(tree), ...elsewhere], new Set(open), new Set(), timing);
}

function handlingSeconds(
  points: readonly SeparablePoint[],
  from: ReadonlySet<PartId>,
  to: ReadonlySet<PartId>,
  timing: Timing,
): number {
  let hands = 0;
  let walk = 0;
  for (const point of points) {
    const wasOpen = from.has(point.partId);
    if (wasOpen === to.has(point.partId)) continue;
    hands += wasOpen ? point.closeSeconds : point.openSeconds;
    walk = Math.max(walk, walkSeconds(point, timing));
  }
  return hands + walk;
}
