import { colours } from './drawing-colours';
import type { PlaceMark } from './marks';

export interface LineStyle {
  stroke: string;
  width: number;
  /** A darker line under it, so that it has an edge on any ground. */
  casing: string | null;
}

/** How a wire says what is known of it: by weight first, then by colour. */
export const wireStyle: Record<PlaceMark, LineStyle> = {
  idle: { stroke: colours.muted, width: 1.75, casing: null },
  cleared: { stroke: colours.slate, width: 1.5, casing: null },
  inQuestion: { stroke: colours.amber, width: 4.5, casing: colours.amberEdge },
  found: { stroke: colours.ember, width: 4.5, casing: colours.ink },
};

export interface SymbolStyle {
  fill: string;
  stroke: string;
  width: number;
  /** Colour of the signs inside. */
  inner: string;
}

export const symbolStyle: Record<PlaceMark, SymbolStyle> = {
  idle: { fill: colours.sheet, stroke: colours.muted, width: 1.75, inner: colours.muted },
  cleared: { fill: colours.sheet, stroke: colours.slate, width: 1.5, inner: colours.slate },
  inQuestion: {
    fill: colours.amber,
    stroke: colours.onAmber,
    width: 2,
    inner: colours.onAmber,
  },
  found: { fill: colours.amber, stroke: colours.ember, width: 2.5, inner: colours.onAmber },
};

/** The order in which marks are painted: what matters more lies on top. */
export const paintOrder: readonly PlaceMark[] = ['idle', 'cleared', 'inQuestion', 'found'];
