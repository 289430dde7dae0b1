import type { Frame } from './layout/frame';
import { boxesOverlap, type Box, type Point } from './layout/geometry';
import { textWidth } from './layout/text-width';

export interface SheetText {
  key: 'front' | 'rear' | 'curbSide' | 'roadSide' | 'frontFace' | 'rearFace';
  at: Point;
  turn: 0 | -90;
  anchor: 'start' | 'middle' | 'end';
  box: Box;
}

type Words = Record<SheetText['key'], string>;

/** Places along an end where its name may stand, as shares of the deck's width. */
const ALONG_THE_END = [0.5, 0.3, 0.7, 0.2, 0.8];

/** The texts of the sheet itself: which end and which side is which. One that finds no free place is left out. */
export function sheetTexts(
  frame: Frame,
  size: number,
  words: Words,
  taken: readonly Box[],
): SheetText[] {
  const { deck, front, rear } = frame;
  const left = (front ?? deck).x;
  const right = rear ? rear.x + rear.width : deck.x + deck.width;
  const above = deck.y - size * 0.5;
  const below = deck.y + deck.height + size * 1.25;
  const free = (box: Box) => !taken.some((other) => boxesOverlap(box, other));

  const level = (key: SheetText['key'], x: number, y: number, anchor: 'start' | 'end') => {
    const width = textWidth(words[key], size);
    const at = (shift: number): SheetText => {
      const from = anchor === 'end' ? x - width - shift : x + shift;
      return {
        key,
        at: { x: anchor === 'end' ? x - shift : from, y },
        turn: 0,
        anchor,
        box: { x: from, y: y - size, width, height: size * 1.25 },
      };
    };
    const shifts = [0, 30, 60, 90, 120, 160, 200].map(at);
    return shifts.find(({ box }) => free(box));
  };
  const upright = (key: SheetText['key'], x: number): SheetText | undefined => {
    const length = textWidth(words[key], size);
    const at = (share: number): SheetText => {
      const y = deck.y + deck.height * share;
      return {
        key,
        at: { x: x + size * 0.35, y },
        turn: -90,
        anchor: 'middle',
        box: { x: x - size * 0.6, y: y - length / 2, width: size * 1.2, height: length },
      };
    };
    return ALONG_THE_END.map(at).find(({ box }) => free(box));
  };
  return [
    level('curbSide', deck.x, above, 'start'),
    level('roadSide', deck.x, below, 'start'),
    front ? level('frontFace', left, below, 'start') : upright('front', left - size * 0.9),
    rear ? level('rearFace', right, below, 'end') : upright('rear', right + size * 0.9),
  ].filter((text) => text !== undefined);
}
