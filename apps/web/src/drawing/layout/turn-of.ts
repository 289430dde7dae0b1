import type { Point } from './geometry';

/** Degrees by which a part is turned so that its feed side faces the wire that comes in; 0 is from the left. */
export function turnOf(route: readonly Point[] | undefined, symbol: number): number {
  if (!route) return 0;
  for (let at = route.length - 1; at > 0; at -= 1) {
    const from = route[at - 1];
    const to = route[at];
    if (!from || !to) break;
    const x = to.x - from.x;
    const y = to.y - from.y;
    // A short jog between two tracks does not turn a plug.
    if (Math.hypot(x, y) < symbol * 0.8) continue;
    if (Math.abs(x) >= Math.abs(y)) return x >= 0 ? 0 : 180;
    return y > 0 ? 90 : -90;
  }
  return 0;
}
