import type { Box, Point } from './geometry';
import { spaceOut } from './space-out';
import { textWidth } from './text-width';

export interface FlagRequest {
  id: string;
  /** Where the harness is parted, in pixels of the screen. */
  at: Point;
  edge: 'top' | 'bottom';
  /** The ways the flag may be written, best first. */
  variants: readonly string[];
}

export interface PlacedFlag {
  id: string;
  text: string;
  box: Box;
  edge: 'top' | 'bottom';
}

const PADDING = 12;
const BETWEEN = 8;

/**
 * Places flags in a row along an edge, each as near above (below) its part as its neighbours allow and inside the
 * sheet. Written shorter where they are too many; those that cannot fit at all are left out.
 */
export function placeFlags(
  requests: readonly FlagRequest[],
  edge: 'top' | 'bottom',
  row: { y: number; height: number; left: number; right: number },
  size: number,
): PlacedFlag[] {
  const asked = requests.filter((request) => request.edge === edge).sort((a, b) => a.at.x - b.at.x);
  const longest = Math.max(0, ...asked.map((request) => request.variants.length));
  for (let variant = 0; variant < longest; variant += 1) {
    const flags = asked.map((request) => {
      const text = request.variants[Math.min(variant, request.variants.length - 1)] ?? '';
      return { request, text, width: textWidth(text, size, true) + 2 * PADDING };
    });
    const widest = Math.max(...flags.map((flag) => flag.width));
    const fits =
      (flags.length - 1) * (widest + BETWEEN) + widest <= row.right - row.left ||
      variant === longest - 1;
    if (!fits) continue;
    const room = Math.max(1, Math.floor((row.right - row.left + BETWEEN) / (widest + BETWEEN)));
    const kept = flags.slice(0, room);
    const centres = spaceOut(
      kept.map((flag) => flag.request.at.x),
      widest + BETWEEN,
      row.left + widest / 2,
      row.right - widest / 2,
    );
    return kept.map((flag, at) => ({
      id: flag.request.id,
      text: flag.text,
      edge,
      box: {
        x: (centres[at] ?? 0) - flag.width / 2,
        y: row.y,
        width: flag.width,
        height: row.height,
      },
    }));
  }
  return [];
}
