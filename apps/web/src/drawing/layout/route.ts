import type { PartId, Run, RunId } from '@lampwright/harness';
import { BoxGrid } from './box-grid';
import { boxAround, growBox, segmentBox, segmentsOf, type Point, type Segment } from './geometry';
import { routeCandidates } from './route-candidates';

interface Drawn {
  segment: Segment;
  from: PartId;
}

/** What makes a route worse, in pixels of detour. */
const COST = {
  bend: 14,
  overSymbol: 90,
  crossing: 9,
  sharedWithStranger: 3,
  sharedWithSibling: -0.6,
};

/**
 * Draws every run as level and upright pieces, feed first. Each takes the cheapest of its candidates: short, few bends,
 * clear of other parts, on the trunk of the runs that leave the same part, and beside the others. Deterministic.
 * O(runs × candidates × things near by).
 */
export function routeRuns(
  runs: readonly Run[],
  positions: ReadonlyMap<PartId, Point>,
  lanes: readonly number[],
  symbol: number,
): Map<RunId, Point[]> {
  const symbols = new BoxGrid<PartId>();
  for (const [id, at] of positions) symbols.add(boxAround(at, symbol * 1.1), id);
  const drawn = new BoxGrid<Drawn>();
  const routes = new Map<RunId, Point[]>();
  for (const run of runs) {
    const from = positions.get(run.from);
    const to = positions.get(run.to);
    if (!from || !to) continue;
    let best: { route: Point[]; cost: number } | null = null;
    for (const route of routeCandidates(from, to, lanes, symbol)) {
      const cost = costOf(route, run, symbols, drawn, best?.cost ?? Infinity);
      if (!best || cost < best.cost - 0.01) best = { route, cost };
    }
    if (!best) continue;
    routes.set(run.id, best.route);
    for (const segment of segmentsOf(best.route)) {
      drawn.add(growBox(segmentBox(segment), 1), { segment, from: run.from });
    }
  }
  return routes;
}

function costOf(
  route: readonly Point[],
  run: Run,
  symbols: BoxGrid<PartId>,
  drawn: BoxGrid<Drawn>,
  enough: number,
): number {
  let cost = (route.length - 2) * COST.bend;
  for (const segment of segmentsOf(route)) {
    const box = segmentBox(segment);
    cost += box.width + box.height;
    if (cost + COST.sharedWithSibling * (box.width + box.height) > enough) return cost;
    for (const id of symbols.over(growBox(box, 0.5))) {
      if (id !== run.from && id !== run.to) cost += COST.overSymbol;
    }
    for (const other of drawn.over(growBox(box, 1))) cost += meeting(segment, other, run);
  }
  return cost;
}

function meeting(segment: Segment, other: Drawn, run: Run): number {
  const shared = sharedLength(segment, other.segment);
  if (shared > 0) {
    return shared * (other.from === run.from ? COST.sharedWithSibling : COST.sharedWithStranger);
  }
  return other.from === run.from ? 0 : COST.crossing;
}

/** How far two pieces that lie on one line cover each other; 0 where one is level and the other upright. */
function sharedLength(one: Segment, two: Segment): number {
  const a = segmentBox(one);
  const b = segmentBox(two);
  const along = Math.min(a.x + a.width, b.x + b.width) - Math.max(a.x, b.x);
  const across = Math.min(a.y + a.height, b.y + b.height) - Math.max(a.y, b.y);
  if (a.height === 0 && b.height === 0) return Math.max(0, along);
  if (a.width === 0 && b.width === 0) return Math.max(0, across);
  return 0;
}
