import { spaceOut } from './space-out';

/** A thing to be placed: `u` along its lane, `v` across the lanes. */
export interface LaneItem {
  id: string;
  u: number;
  v: number;
}

export interface LaneArea {
  uLow: number;
  uHigh: number;
  vLow: number;
  vHigh: number;
}

export interface Laned {
  /** By id, where each item came to lie. */
  places: Map<string, { u: number; v: number }>;
  /** The `v` of every lane, ascending. */
  lanes: number[];
  /** Mean distance that items were moved along their lane. */
  moved: number;
}

/**
 * Sorts items into lanes by `v`, then spaces them along and across so that no two are nearer than `gap` in both
 * directions. Within a lane the order by `u` is kept, and so is the order of lanes. A lane with more items than fit is
 * split into staggered ones. O(n log n).
 *
 * @returns `null` when the items cannot fit at this gap.
 */
export function laneOut(items: readonly LaneItem[], area: LaneArea, gap: number): Laned | null {
  const room = Math.floor((area.vHigh - area.vLow) / gap) + 1;
  const capacity = Math.floor((area.uHigh - area.uLow) / gap) + 1;
  for (let tolerance = gap * 0.6; ; tolerance *= 1.5) {
    const groups = group(items, tolerance);
    const lanes = groups.flatMap((lane) => stagger(lane, capacity));
    if (lanes.length <= room) return place(lanes, area, gap);
    if (groups.length <= 1) return null;
  }
}

/** Neighbours by `v` share a lane while they are within `tolerance` of its first. */
function group(items: readonly LaneItem[], tolerance: number): LaneItem[][] {
  const groups: LaneItem[][] = [];
  for (const item of [...items].sort((a, b) => a.v - b.v)) {
    const lane = groups.at(-1);
    if (lane?.[0] && item.v - lane[0].v <= tolerance) lane.push(item);
    else groups.push([item]);
  }
  return groups.map((lane) => [...lane].sort((a, b) => a.u - b.u));
}

function stagger(lane: LaneItem[], capacity: number): LaneItem[][] {
  const ways = Math.ceil(lane.length / Math.max(1, capacity));
  return Array.from({ length: ways }, (_, way) => lane.filter((_item, at) => at % ways === way));
}

function place(lanes: LaneItem[][], area: LaneArea, gap: number): Laned {
  const heights = lanes.map((lane) => lane.reduce((sum, item) => sum + item.v, 0) / lane.length);
  const spaced = spaceOut(heights, gap, area.vLow, area.vHigh);
  const places = new Map<string, { u: number; v: number }>();
  let moved = 0;
  lanes.forEach((lane, at) => {
    const along = lane.map((item) => item.u);
    spaceOut(along, gap, area.uLow, area.uHigh).forEach((u, rank) => {
      const item = lane[rank];
      if (!item) return;
      moved += Math.abs(u - item.u);
      places.set(item.id, { u, v: spaced[at] ?? 0 });
    });
  });
  return { places, lanes: spaced, moved: items(lanes) ? moved / items(lanes) : 0 };
}

function items(lanes: LaneItem[][]): number {
  return lanes.reduce((count, lane) => count + lane.length, 0);
}
