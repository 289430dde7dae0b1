import type { Point } from './layout/geometry';

/** The `d` of a route with rounded bends, pixels. */
export function pathOf(points: readonly Point[], radius: number): string {
  const [first, ...rest] = points;
  if (!first) return '';
  let path = `M${at(first)}`;
  let from = first;
  rest.forEach((bend, index) => {
    const next = rest[index + 1];
    const r = next ? Math.min(radius, length(from, bend) / 2, length(bend, next) / 2) : 0;
    if (next && r > 0.5) {
      path += `L${at(towards(bend, from, r))}Q${at(bend)} ${at(towards(bend, next, r))}`;
    } else {
      path += `L${at(bend)}`;
    }
    from = bend;
  });
  return path;
}

/** The point halfway along a route. */
export function middleOf(points: readonly Point[]): Point | null {
  const total = points
    .slice(1)
    .reduce((sum, point, index) => sum + length(points[index] ?? point, point), 0);
  let left = total / 2;
  for (let index = 1; index < points.length; index += 1) {
    const a = points[index - 1];
    const b = points[index];
    if (!a || !b) break;
    const piece = length(a, b);
    if (left <= piece) return piece ? towards(a, b, left) : a;
    left -= piece;
  }
  return points[0] ?? null;
}

function at({ x, y }: Point): string {
  return `${Math.round(x * 10) / 10} ${Math.round(y * 10) / 10}`;
}

function length(a: Point, b: Point): number {
  return Math.hypot(a.x - b.x, a.y - b.y);
}

function towards(from: Point, to: Point, by: number): Point {
  const whole = length(from, to);
  return { x: from.x + ((to.x - from.x) * by) / whole, y: from.y + ((to.y - from.y) * by) / whole };
}
