import type { Box, Point } from './geometry';

export interface LabelCandidate {
  box: Box;
  /** 0 is the best position. */
  cost: number;
  leader: boolean;
}

/**
 * The positions a label may take around its symbol, the usual ones first: beside it, above and below, at the corners,
 * then further off with a line to the symbol.
 */
export function labelCandidates(
  at: Point,
  reach: number,
  width: number,
  height: number,
  size: number,
): LabelCandidate[] {
  const gap = size * 0.25;
  const off = reach + gap;
  const box = (x: number, y: number): Box => ({ x, y, width, height });
  const above = at.y - off - height;
  const below = at.y + off;
  const right = at.x + off;
  const left = at.x - off - width;
  const middle = at.y - height / 2;
  const centred = at.x - width / 2;
  const near = [
    box(centred, above),
    box(centred, below),
    box(right, middle),
    box(left, middle),
    box(at.x - reach, above),
    box(at.x + reach - width, above),
    box(at.x - reach, below),
    box(at.x + reach - width, below),
    box(right, above + height * 0.6),
    box(right, below - height * 0.6),
    box(left, above + height * 0.6),
    box(left, below - height * 0.6),
  ].map((candidate, rank) => ({ box: candidate, cost: rank * 0.4, leader: false }));

  const step = height + gap;
  const far = [1, 2].flatMap((steps) =>
    [
      box(centred, above - steps * step),
      box(centred, below + steps * step),
      box(right, above - steps * step),
      box(right, below + steps * step),
      box(left, above - steps * step),
      box(left, below + steps * step),
    ].map((candidate, rank) => ({
      box: candidate,
      cost: 4 + 2.5 * steps + rank * 0.3,
      leader: true,
    })),
  );
  return [...near, ...far];
}
