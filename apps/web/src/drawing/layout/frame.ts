import type { Box } from './geometry';
import type { Extent } from './extent';

export interface Size {
  width: number;
  height: number;
}

export interface Margins {
  top: number;
  right: number;
  bottom: number;
  left: number;
}

/** Where the trailer lies on the sheet and how large a metre is drawn. */
export interface Frame {
  /** The deck as seen from above, nose left. */
  deck: Box;
  /** The end faces folded out flat beside the deck; `null` where not drawn. */
  front: Box | null;
  rear: Box | null;
  /** Pixels a metre along and across. */
  alongScale: number;
  acrossScale: number;
}

export interface FaceWidths {
  front: number;
  rear: number;
}

/** A trailer is far longer than wide; across it may be drawn this many times wider than along. */
const MOST_STRETCH = 3.5;

/** Fits the trailer into the sheet: to one scale along, to another across where that reads better. */
export function frameOf(extent: Extent, sheet: Size, margins: Margins, faces: FaceWidths): Frame {
  const width = Math.max(40, sheet.width - margins.left - margins.right - faces.front - faces.rear);
  const height = Math.max(40, sheet.height - margins.top - margins.bottom);
  const alongScale = Math.min(width / extent.length, height / extent.width);
  const acrossScale = Math.min(height / extent.width, alongScale * MOST_STRETCH);
  const deckWidth = alongScale * extent.length;
  const deckHeight = acrossScale * extent.width;
  const x = margins.left + faces.front + (width - deckWidth) / 2;
  const y = margins.top + (height - deckHeight) / 2;
  const face = (left: number, faceWidth: number): Box | null =>
    faceWidth ? { x: left, y, width: faceWidth, height: deckHeight } : null;
  return {
    deck: { x, y, width: deckWidth, height: deckHeight },
    front: face(x - faces.front, faces.front),
    rear: face(x + deckWidth, faces.rear),
    alongScale,
    acrossScale,
  };
}

/** The deck with its folded-out faces. */
export function wholeOf({ deck, front, rear }: Frame): Box {
  return {
    x: deck.x - (front?.width ?? 0),
    y: deck.y,
    width: deck.width + (front?.width ?? 0) + (rear?.width ?? 0),
    height: deck.height,
  };
}
