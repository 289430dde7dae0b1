import type { Box, Point } from './geometry';
import { spaceOut } from './space-out';
import { textWidth } from './text-width';

export type FlagEdge = 'top' | 'bottom';

export interface FlagRequest {
  id: string;
  /** Where the harness is parted, in pixels of the screen. */
  at: Point;
  edge: FlagEdge;
  /** The ways the flag may be written, best first. */
  variants: readonly string[];
}

export interface PlacedFlag {
  id: string;
  text: string;
  box: Box;
  edge: FlagEdge;
}

export interface FlagRow {
  y: number;
  height: number;
  left: number;
  right: number;
}

const PADDING = 12;
const BETWEEN = 8;

interface Flag {
  request: FlagRequest;
  text: string;
  width: number;
}

/**
 * Places the flags of one edge in a row, each as near above (below) its part as its neighbours allow and inside the
 * sheet. Written shorter where they are too many; those that still cannot fit are left out, from the rear.
 */
export function placeFlags(
  requests: readonly FlagRequest[],
  edge: FlagEdge,
  row: FlagRow,
  size: number,
): PlacedFlag[] {
  const asked = requests.filter((request) => request.edge === edge).sort((a, b) => a.at.x - b.at.x);
  const longest = Math.max(1, ...asked.map((request) => request.variants.length));
  let flags: Flag[] = [];
  for (let variant = 0; variant < longest; variant += 1) {
    flags = asked.map((request) => written(request, variant, size));
    if (totalWidth(flags) <= row.right - row.left) break;
  }
  while (flags.length > 0 && totalWidth(flags) > row.right - row.left) flags.pop();
  return inRow(flags, edge, row);
}

function written(request: FlagRequest, variant: number, size: number): Flag {
  const text = request.variants[Math.min(variant, request.variants.length - 1)] ?? '';
  return { request, text, width: textWidth(text, size, true) + 2 * PADDING };
}

function totalWidth(flags: readonly Flag[]): number {
  return flags.reduce((sum, flag) => sum + flag.width + BETWEEN, -BETWEEN);
}

function inRow(flags: readonly Flag[], edge: FlagEdge, row: FlagRow): PlacedFlag[] {
  const gaps = flags
    .slice(1)
    .map((flag, at) => ((flags[at]?.width ?? 0) + flag.width) / 2 + BETWEEN);
  const centres = spaceOut(
    flags.map((flag) => flag.request.at.x),
    gaps,
    row.left + (flags[0]?.width ?? 0) / 2,
    row.right - (flags.at(-1)?.width ?? 0) / 2,
  );
  return flags.map(({ request, text, width }, at) => ({
    id: request.id,
    text,
    edge,
    box: { x: (centres[at] ?? 0) - width / 2, y: row.y, width, height: row.height },
  }));
}
