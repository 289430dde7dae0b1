import type { Part, PartId } from '@lampwright/harness';
import type { Box, Point } from './layout/geometry';
import type { FlagRequest } from './layout/place-flags';

export interface Cut extends FlagRequest {
  /** From the flag's edge across the part, pixels of the screen. */
  line: [from: Point, to: Point];
}

interface Input {
  parts: readonly Part[];
  cut: readonly PartId[];
  /** Where a part lies on the screen. */
  screen: (id: PartId) => Point | undefined;
  /** The deck on the screen. */
  deck: Box;
  symbol: number;
  wording: (part: Part, alone: boolean) => string[];
}

const PAST = 14;

/**
 * The amber lines. A single plug is cut across the whole trailer, as that is what it parts; lamps, modules and several
 * points at once get a line from the nearer side that ends just past the part.
 */
export function cutsOf({ parts, cut, screen, deck, symbol, wording }: Input): Cut[] {
  const alone = cut.length === 1;
  return parts.flatMap((part): Cut[] => {
    const at = cut.includes(part.id) ? screen(part.id) : undefined;
    if (!at) return [];
    const whole = alone && part.kind === 'plug';
    const edge = !whole && at.y > deck.y + deck.height / 2 + 1 ? 'bottom' : 'top';
    const past = symbol * 0.95;
    const end = whole
      ? Math.max(deck.y + deck.height + PAST, at.y + past)
      : at.y + (edge === 'top' ? past : -past);
    return [
      {
        id: part.id,
        at,
        edge,
        variants: wording(part, alone),
        line: [
          { x: at.x, y: edge === 'top' ? deck.y - PAST : deck.y + deck.height + PAST },
          { x: at.x, y: end },
        ],
      },
    ];
  });
}
