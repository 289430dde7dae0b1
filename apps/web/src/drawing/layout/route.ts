import type { PartId, Run, RunId } from '@lampwright/harness';
import { BoxGrid } from './box-grid';
import {
  boxAround,
  growBox,
  pointInside,
  segmentBox,
  segmentsOf,
  type Box,
  type Point,
  type Segment,
} from './geometry';
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
  againstTheGrain: 10,
  sharedWithStranger: 3,
  sharedWithSibling: -0.6,
};

/** Beyond this many runs no one follows a single wire, and only the plainest candidates are tried. */
const MANY = 250;
const FEW = 2;

export interface RouteInput {
  /** Feed first. */
  runs: readonly Run[];
  positions: ReadonlyMap<PartId, Point>;
  /** The `y` of the lanes. */
  lanes: readonly number[];
  symbol: number;
  /** No wire leaves it. */
  bounds: Box;
}

/** What is on the sheet while one run after the other is drawn. */
interface Sheet {
  symbols: BoxGrid<PartId>;
  drawn: BoxGrid<Drawn>;
  /** Parts whose own runs go on up or down rather than along. */
  uprights: ReadonlySet<PartId>;
  leaves: ReadonlySet<PartId>;
}

/**
 * Draws every run as level and upright pieces, feed first. Each takes the cheapest of its candidates: short, few bends,
 * clear of other parts, on the trunk of the runs that leave the same part, and beside the others. Deterministic.
 * O(runs × candidates × things near by).
 */
export function routeRuns(input: RouteInput): Map<RunId, Point[]> {
  const { runs, positions, lanes, symbol, bounds } = input;
  const sheet: Sheet = {
    symbols: new BoxGrid<PartId>(),
    drawn: new BoxGrid<Drawn>(),
    ...directions(runs, positions),
  };
  for (const [id, at] of positions) sheet.symbols.add(boxAround(at, symbol * 1.1), id);
  const routes = new Map<RunId, Point[]>();
  for (const run of runs) {
    const from = positions.get(run.from);
    const to = positions.get(run.to);
    if (!from || !to) continue;
    let best: { route: Point[]; cost: number } | null = null;
    const candidates = routeCandidates(from, to, lanes, symbol);
    for (const route of runs.length > MANY ? candidates.slice(0, FEW) : candidates) {
      if (!route.slice(1, -1).every((bend) => pointInside(bend, bounds))) continue;
      const cost = costOf(route, run, sheet, best?.cost ?? Infinity);
      if (!best || cost < best.cost - 0.01) best = { route, cost };
    }
    const route = best?.route ?? [from, { x: to.x, y: from.y }, to];
    routes.set(run.id, route);
    for (const segment of segmentsOf(route)) {
      sheet.drawn.add(growBox(segmentBox(segment), 1), { segment, from: run.from });
    }
  }
  return routes;
}

function directions(
  runs: readonly Run[],
  positions: ReadonlyMap<PartId, Point>,
): Pick<Sheet, 'uprights' | 'leaves'> {
  const lean = new Map<PartId, number>();
  for (const run of runs) {
    const from = positions.get(run.from);
    const to = positions.get(run.to);
    if (!from || !to) continue;
    const upright = Math.abs(to.y - from.y) > Math.abs(to.x - from.x) ? 1 : -1;
    lean.set(run.from, (lean.get(run.from) ?? 0) + upright);
  }
  return {
    uprights: new Set([...lean].filter(([, sum]) => sum > 0).map(([id]) => id)),
    leaves: new Set([...positions.keys()].filter((id) => !lean.has(id))),
  };
}

/** The cost of a route, or more than `enough` as soon as that is certain. */
function costOf(route: readonly Point[], run: Run, sheet: Sheet, enough: number): number {
  const segments = segmentsOf(route);
  const lengths = segments.map(({ a, b }) => Math.abs(a.x - b.x) + Math.abs(a.y - b.y));
  const length = lengths.reduce((sum, piece) => sum + piece, 0);
  // All of it may turn out to be shared with siblings; what is certain is counted first.
  let cost = (route.length - 2) * COST.bend + entryCost(route, run, sheet) + length;
  const most = -COST.sharedWithSibling * length;
  for (const segment of segments) {
    if (cost - most > enough) return Infinity;
    for (const id of sheet.symbols.over(growBox(segmentBox(segment), 0.5))) {
      if (id !== run.from && id !== run.to) cost += COST.overSymbol;
    }
  }
  for (const segment of segments) {
    if (cost - most > enough) return Infinity;
    let bonus = 0;
    for (const other of sheet.drawn.over(growBox(segmentBox(segment), 1))) {
      const change = meeting(segment, other, run);
      if (change < 0) bonus = Math.min(bonus, change);
      else cost += change;
    }
    cost += bonus;
  }
  return cost;
}

/** A wire should come into a plug or splice in the direction in which it goes on. */
function entryCost(route: readonly Point[], run: Run, sheet: Sheet): number {
  if (sheet.leaves.has(run.to)) return 0;
  const last = route.at(-1);
  const before = route.at(-2);
  const upright = last !== undefined && before !== undefined && last.x === before.x;
  return upright === sheet.uprights.has(run.to) ? 0 : COST.againstTheGrain;
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
