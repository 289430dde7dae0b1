import type { Point } from './geometry';

/** Distance between wires that run side by side, pixels. */
const TRACK = 5;

/**
 * The ways a run may be drawn from one part to another, all of level and upright pieces: straight, with one bend, and
 * with two bends through a channel. Upright channels lie near either end, level ones beside the ends' own lines and
 * halfway between lanes, so that wires bundle along the trunk and the sills as they do on a trailer.
 */
export function routeCandidates(
  from: Point,
  to: Point,
  lanes: readonly number[],
  symbol: number,
): Point[][] {
  if (Math.abs(from.y - to.y) < 0.5 || Math.abs(from.x - to.x) < 0.5) {
    return [[from, to], ...detours(from, to, lanes, symbol)];
  }
  return [
    [from, { x: to.x, y: from.y }, to],
    [from, { x: from.x, y: to.y }, to],
    ...detours(from, to, lanes, symbol),
  ];
}

function detours(from: Point, to: Point, lanes: readonly number[], symbol: number): Point[][] {
  const level = levelChannels(from, to, lanes, symbol).map((y) => [
    from,
    { x: from.x, y },
    { x: to.x, y },
    to,
  ]);
  const upright = uprightChannels(from, to, symbol).map((x) => [
    from,
    { x, y: from.y },
    { x, y: to.y },
    to,
  ]);
  return [...level, ...upright];
}

function levelChannels(from: Point, to: Point, lanes: readonly number[], symbol: number): number[] {
  const near = symbol * 0.7;
  const own = [1, 2, 3].flatMap((track) => [from.y - track * TRACK, from.y + track * TRACK]);
  const beside = [from.y - near, from.y + near, to.y - near, to.y + near];
  const low = Math.min(from.y, to.y);
  const high = Math.max(from.y, to.y);
  const between = lanes
    .slice(1)
    .map((lane, at) => (lane + (lanes[at] ?? lane)) / 2)
    .filter((y) => y > low && y < high);
  return [...own, ...beside, ...between];
}

function uprightChannels(from: Point, to: Point, symbol: number): number[] {
  const way = to.x < from.x ? -1 : 1;
  const near = symbol * 0.75;
  return [
    to.x - way * near,
    from.x + way * near,
    (from.x + to.x) / 2,
    to.x - way * (near + TRACK),
    from.x + way * (near + TRACK),
    to.x + way * near,
  ];
}
