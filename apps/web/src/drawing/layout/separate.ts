import type { Part, PartId } from '@lampwright/harness';
import { heightOf, type Zone } from './faces';
import type { Frame } from './frame';
import type { Box, Point } from './geometry';
import { laneOut, type Laned, type LaneItem } from './lanes';

export interface Separation {
  positions: Map<PartId, Point>;
  /** Side of the square that a symbol may fill, pixels. */
  symbol: number;
  /** The `y` of every lane of the deck, ascending. */
  lanes: number[];
}

/** Symbol sizes from roomy to tiny; the first that fits without pulling parts far from their place is taken. */
const SIZES = [26, 22, 19, 16, 13, 10, 8, 6, 4, 3, 2] as const;
const SMALLEST = 1;
/** Free room between two symbols, as a share of their size. */
const AIR = 0.35;
/** Symbols are made smaller rather than moved further than this many of their own sizes, on average. */
const MOST_MOVED = 1.6;
/** Below this size small symbols serve worse than moved ones. */
const STILL_READABLE = 16;

/**
 * Gives every part a place of its own near its true one. On the deck the order along the trailer is kept within a side
 * and the order of sides always; on a folded-out face the order of sides is kept within a height, and the order of
 * heights always. Deterministic. O(n log n) for each size tried.
 */
export function separate(
  parts: readonly Part[],
  zones: ReadonlyMap<PartId, Zone>,
  frame: Frame,
  largest: number,
): Separation {
  for (const size of SIZES) {
    if (size > largest) continue;
    const tried = attempt(parts, zones, frame, size);
    if (tried) return tried;
  }
  return attempt(parts, zones, frame, SMALLEST) ?? heap(parts, frame);
}

function attempt(
  parts: readonly Part[],
  zones: ReadonlyMap<PartId, Zone>,
  frame: Frame,
  size: number,
): Separation | null {
  const gap = size * (1 + AIR);
  const inZone = (zone: Zone) => parts.filter((part) => zones.get(part.id) === zone);
  const deck = laneOnDeck(inZone('deck'), frame, gap);
  const front = laneOnFace(inZone('front'), frame, frame.front, -1, gap);
  const rear = laneOnFace(inZone('rear'), frame, frame.rear, 1, gap);
  if (!deck || !front || !rear) return null;
  if (size > STILL_READABLE && deck.moved > size * MOST_MOVED) return null;

  const positions = new Map<PartId, Point>();
  for (const [id, { u, v }] of deck.places) positions.set(id, { x: u, y: v });
  for (const [id, { u, v }] of [...front.places, ...rear.places]) positions.set(id, { x: v, y: u });
  return { positions, symbol: size, lanes: deck.lanes };
}

function laneOnDeck(parts: readonly Part[], frame: Frame, gap: number): Laned | null {
  const items = parts.map((part): LaneItem => ({
    id: part.id,
    u: frame.deck.x + part.at.along * frame.alongScale,
    v: acrossToY(part, frame),
  }));
  const area = inner(frame.deck, gap);
  // What sits at the very front, as the inlet does, may straddle the nose.
  const nose = frame.front ? area.x : frame.deck.x;
  return laneOut(
    items,
    { uLow: nose, uHigh: area.x + area.width, vLow: area.y, vHigh: area.y + area.height },
    gap,
  );
}

/** A face is laned by height instead: its columns are heights, and along a column parts keep their order of sides. */
function laneOnFace(
  parts: readonly Part[],
  frame: Frame,
  face: Box | null,
  outwards: 1 | -1,
  gap: number,
): Laned | null {
  if (!face) return { places: new Map(), lanes: [], moved: 0 };
  const area = inner(face, gap * 1.2);
  const tallest = Math.max(...parts.map(heightOf), 1);
  const items = parts.map((part): LaneItem => {
    const rise = (heightOf(part) / tallest) * area.width;
    return {
      id: part.id,
      u: acrossToY(part, frame),
      v: outwards > 0 ? area.x + rise : area.x + area.width - rise,
    };
  });
  return laneOut(
    items,
    { uLow: area.y, uHigh: area.y + area.height, vLow: area.x, vHigh: area.x + area.width },
    gap,
  );
}

/** Curb side is up: that is where it lies for a trailer seen from above, nose left. */
function acrossToY(part: Part, frame: Frame): number {
  return frame.deck.y + frame.deck.height / 2 - part.at.across * frame.acrossScale;
}

function inner(box: Box, gap: number): Box {
  const edge = Math.min(gap * 0.75, box.width / 4, box.height / 4);
  return {
    x: box.x + edge,
    y: box.y + edge,
    width: box.width - 2 * edge,
    height: box.height - 2 * edge,
  };
}

/** The last resort for a plan that no sheet can hold: a part every few pixels in reading order. */
function heap(parts: readonly Part[], frame: Frame): Separation {
  const columns = Math.ceil(Math.sqrt(parts.length * 2));
  const positions = new Map(
    parts.map((part, at): [PartId, Point] => [
      part.id,
      {
        x: frame.deck.x + ((at % columns) + 0.5) * (frame.deck.width / columns),
        y: frame.deck.y + (Math.floor(at / columns) + 0.5) * ((2 * frame.deck.height) / columns),
      },
    ]),
  );
  return { positions, symbol: SMALLEST, lanes: [frame.deck.y + frame.deck.height / 2] };
}
