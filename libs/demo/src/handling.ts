import type { Separable } from '@lampwright/harness';

/**
 * Seconds to reach, open and close a point with gloves on, standing at it; ladders included, walking not.
 * Common practice, no source: estimates, which a yard replaces with its own times.
 */
const SECONDS = {
  /** Round weatherproof plug, half a turn. */
  twist: [15, 20],
  /** Sealed rectangular plug with a latch. */
  latch: [25, 25],
  /** The same, above the tyres or behind a cross member, where it takes an arm's length. */
  latchDeep: [45, 50],
  /** Plug inside the nose box, behind four cover screws. */
  noseBox: [75, 90],
  /** Old bullet connectors under tape. */
  taped: [60, 80],
  /** Plug reached from a ladder. */
  plugHigh: [110, 100],
  /** Lamp in a rubber grommet: pry it out, unplug it. */
  grommet: [35, 45],
  grommetHigh: [120, 115],
  /** Two screws, then the plug. */
  screwed: [70, 85],
  screwedHigh: [150, 150],
  /** Lamp with a plug on its pigtail that can be reached behind the bracket. */
  pigtail: [20, 25],
  /** Electronic unit with a sealed, locked plug under a cover. */
  unit: [50, 60],
} as const satisfies Record<string, readonly [open: number, close: number]>;

export type Handling = keyof typeof SECONDS;

export function separable(handling: Handling): Separable {
  const [openSeconds, closeSeconds] = SECONDS[handling];
  return { openSeconds, closeSeconds };
}
