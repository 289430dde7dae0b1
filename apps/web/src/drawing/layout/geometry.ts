/** Pixels of the drawing at fit scale; `x` runs rearwards, `y` runs to the road side. */
export interface Point {
  x: number;
  y: number;
}

export interface Box {
  x: number;
  y: number;
  width: number;
  height: number;
}

/** A straight piece of a route, level or upright. */
export interface Segment {
  a: Point;
  b: Point;
}

export function boxesOverlap(a: Box, b: Box): boolean {
  return a.x < b.x + b.width && b.x < a.x + a.width && a.y < b.y + b.height && b.y < a.y + a.height;
}

export function boxAround(centre: Point, width: number, height = width): Box {
  return { x: centre.x - width / 2, y: centre.y - height / 2, width, height };
}

export function boxInside(inner: Box, outer: Box): boolean {
  return (
    inner.x >= outer.x &&
    inner.y >= outer.y &&
    inner.x + inner.width <= outer.x + outer.width &&
    inner.y + inner.height <= outer.y + outer.height
  );
}

export function pointInside({ x, y }: Point, box: Box): boolean {
  return x >= box.x && y >= box.y && x <= box.x + box.width && y <= box.y + box.height;
}

export function growBox(box: Box, by: number): Box {
  return { x: box.x - by, y: box.y - by, width: box.width + 2 * by, height: box.height + 2 * by };
}

export function segmentsOf(points: readonly Point[]): Segment[] {
  return points.slice(1).map((b, at) => ({ a: points[at] ?? b, b }));
}

/** The smallest box around a level or upright segment; it has no thickness. */
export function segmentBox({ a, b }: Segment): Box {
  return {
    x: Math.min(a.x, b.x),
    y: Math.min(a.y, b.y),
    width: Math.abs(a.x - b.x),
    height: Math.abs(a.y - b.y),
  };
}

export function clamp(value: number, low: number, high: number): number {
  return Math.min(Math.max(value, low), high);
}
