import type { Frame } from './layout/frame';
import type { Box, Point } from './layout/geometry';
import { textWidth } from './layout/text-width';

export interface SheetText {
  key: 'front' | 'rear' | 'curbSide' | 'roadSide' | 'frontFace' | 'rearFace';
  at: Point;
  turn: 0 | -90;
  box: Box;
}

/** The texts of the sheet itself: which end and which side is which. */
export function sheetTexts(
  frame: Frame,
  size: number,
  words: Record<SheetText['key'], string>,
): SheetText[] {
  const { deck, front, rear } = frame;
  const left = (front ?? deck).x;
  const right = rear ? rear.x + rear.width : deck.x + deck.width;
  const middle = deck.y + deck.height / 2;
  const level = (key: SheetText['key'], x: number, y: number): SheetText => ({
    key,
    at: { x, y },
    turn: 0,
    box: { x, y: y - size, width: textWidth(words[key], size), height: size * 1.25 },
  });
  const upright = (key: SheetText['key'], x: number): SheetText => {
    const length = textWidth(words[key], size);
    return {
      key,
      at: { x: x + size * 0.35, y: middle },
      turn: -90,
      box: { x: x - size * 0.6, y: middle - length / 2, width: size * 1.2, height: length },
    };
  };
  return [
    level('curbSide', deck.x, deck.y - size * 0.5),
    level('roadSide', deck.x, deck.y + deck.height + size * 1.2),
    upright(front ? 'frontFace' : 'front', left - size * 0.9),
    upright(rear ? 'rearFace' : 'rear', right + size * 0.9),
  ];
}
