import type { Point } from './geometry';

/**
 * The id nearest to a touch, within `reach`; `null` where none is that near. Touch areas may overlap: the nearest part
 * gets the touch, as if each had its own cell. O(n).
 */
export function nearestTo(
  touch: Point,
  points: ReadonlyMap<string, Point>,
  reach: number,
): string | null {
  let nearest: { id: string; distance: number } | null = null;
  for (const [id, at] of points) {
    const distance = Math.hypot(at.x - touch.x, at.y - touch.y);
    if (distance > reach || (nearest && distance >= nearest.distance)) continue;
    nearest = { id, distance };
  }
  return nearest?.id ?? null;
}
