import type { Part, PartId } from '@lampwright/harness';
import type { Box, Point } from './layout/geometry';
import type { FlagEdge, FlagRequest } from './layout/place-flags';

export interface Cut extends FlagRequest {
  /** The amber line across the wire, pixels of the screen. */
  stroke: [from: Point, to: Point];
  /** The thin line from the flag to the stroke; it starts at the stroke. */
  leader: Point[];
}

interface Input {
  parts: readonly Part[];
  cut: readonly PartId[];
  /** Where the parts lie on the screen. */
  screen: ReadonlyMap<PartId, Point>;
  /** By part, degrees by which its feed side is turned. */
  turn: (part: PartId) => number;
  /** The deck on the screen. */
  deck: Box;
  symbol: number;
  /** False where the sheet has no room for flags below the trailer. */
  below: boolean;
  wording: (part: Part, alone: boolean) => string[];
}

const PAST = 14;
/** How far a short stroke goes past its part on either side, in symbols. */
const REACH = 1.5;

/**
 * The cuts, each square to the wire it parts. A single plug in a wire along the trailer, with nothing beside it, is cut
 * across the whole trailer; any other point by a short stroke, so that no line seems to part what it only passes.
 */
export function cutsOf(input: Input): Cut[] {
  const { parts, cut, screen, deck, symbol, below, wording } = input;
  const alone = cut.length === 1;
  const bottom = deck.y + deck.height;
  return parts.flatMap((part): Cut[] => {
    const at = cut.includes(part.id) ? screen.get(part.id) : undefined;
    if (!at) return [];
    const upright = Math.abs(input.turn(part.id)) === 90;
    const column = [...screen]
      .filter(([id, other]) => id !== part.id && Math.abs(other.x - at.x) < symbol)
      .map(([, other]) => other.y);
    const common = { id: part.id, at, variants: wording(part, alone) };
    if (alone && part.kind === 'plug' && !upright && column.length === 0) {
      const stroke: Cut['stroke'] = [
        { x: at.x, y: Math.min(deck.y, at.y) - PAST },
        { x: at.x, y: Math.max(bottom, at.y + symbol) + PAST },
      ];
      return [{ ...common, edge: 'top', stroke, leader: [stroke[0]] }];
    }
    const edge = below ? edgeFor(part, at, column, deck, input.turn(part.id)) : 'top';
    const out = edge === 'top' ? -1 : 1;
    const start = edge === 'top' ? Math.min(deck.y, at.y) - PAST : Math.max(bottom, at.y) + PAST;
    if (part.kind !== 'plug') {
      const stroke = strokeBefore(at, input.turn(part.id), symbol);
      return [{ ...common, edge, stroke, leader: [at, { x: at.x, y: start }] }];
    }
    const long = symbol * REACH;
    if (!upright) {
      const near = { x: at.x, y: at.y + out * long };
      const stroke: Cut['stroke'] = [near, { x: at.x, y: at.y - out * long }];
      return [{ ...common, edge, stroke, leader: [near, { x: at.x, y: start }] }];
    }
    const side = freerSide(at, screen, symbol, deck, edge);
    const near = { x: at.x + side * long, y: at.y };
    const stroke: Cut['stroke'] = [near, { x: at.x - side * long, y: at.y }];
    return [{ ...common, edge, stroke, leader: [near, { x: near.x, y: start }] }];
  });
}

/** The flag's edge: where its line passes less; for a lamp or module the side away from its wire, then the nearer. */
function edgeFor(
  part: Part,
  at: Point,
  column: readonly number[],
  deck: Box,
  turn: number,
): FlagEdge {
  const above = column.filter((y) => y < at.y).length;
  const passes = 2 * above - column.length;
  if (part.kind === 'plug') return passes > 0 ? 'bottom' : 'top';
  const wire = turn === 90 ? 2 : turn === -90 ? -2 : 0;
  const lower = at.y > deck.y + deck.height / 2 ? 0.5 : -0.5;
  return passes + wire + lower > 0 ? 'bottom' : 'top';
}

/** A short stroke across the wire just before a lamp or module. */
function strokeBefore(at: Point, turn: number, symbol: number): Cut['stroke'] {
  const angle = (turn * Math.PI) / 180;
  const feed = { x: -Math.round(Math.cos(angle)), y: -Math.round(Math.sin(angle)) };
  const middle = { x: at.x + feed.x * symbol * 0.95, y: at.y + feed.y * symbol * 0.95 };
  return [
    { x: middle.x + feed.y * symbol * 0.9, y: middle.y - feed.x * symbol * 0.9 },
    { x: middle.x - feed.y * symbol * 0.9, y: middle.y + feed.x * symbol * 0.9 },
  ];
}

/** The side on which the line from the flag passes, or ends on, fewer others; the front where it is the same. */
function freerSide(
  at: Point,
  screen: ReadonlyMap<PartId, Point>,
  symbol: number,
  deck: Box,
  edge: FlagEdge,
): 1 | -1 {
  const near = symbol * 0.7;
  const onTheWay = (y: number) => (edge === 'top' ? y < at.y + near : y > at.y - near);
  const passed = (side: 1 | -1) =>
    [...screen.values()].filter(
      (other) => onTheWay(other.y) && Math.abs(other.x - at.x - side * symbol * REACH) < near,
    ).length;
  if (at.x - symbol * REACH < deck.x) return 1;
  return passed(1) < passed(-1) ? 1 : -1;
}
