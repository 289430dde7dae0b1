import { boxAround, growBox, segmentBox, segmentsOf, type Box } from './layout/geometry';
import type { DrawingLayout } from './layout/layout-harness';
import type { LabelSurroundings } from './layout/place-labels';
import type { DrawingMarks } from './marks';
import type { SheetText } from './sheet-texts';

/** What labels must keep off, and what they had better keep off. */
export function labelSurroundings(
  layout: DrawingLayout,
  marks: DrawingMarks,
  texts: readonly SheetText[],
  ink: number,
  dimensionY: number | null,
): Omit<LabelSurroundings, 'size'> {
  const { sheet, frame } = layout;
  const { deck } = frame;
  const cut = new Set(marks.cut);
  const symbols = layout.parts.flatMap((part) => {
    const at = layout.positions.get(part.id);
    if (!at) return [];
    const share = part.kind === 'splice' ? 0.5 : 1.08;
    return boxAround(at, layout.symbol * ink * share);
  });
  const cutLines = layout.parts.flatMap((part): Box[] => {
    const at = layout.positions.get(part.id);
    if (!at || !cut.has(part.id)) return [];
    return [{ x: at.x - 5 * ink, y: 0, width: 10 * ink, height: sheet.height }];
  });
  const scaleRow = { x: 0, y: sheet.height - 18, width: sheet.width, height: 18 };
  const dimension =
    dimensionY === null ? [] : [{ x: deck.x, y: dimensionY - 8, width: deck.width, height: 16 }];
  return {
    sheet: { x: 2, y: 2, width: sheet.width - 4, height: sheet.height - 4 },
    solid: [...symbols, ...texts.map((text) => text.box), ...cutLines, scaleRow, ...dimension],
    soft: [
      ...[...layout.routes.values()].flatMap((route) =>
        segmentsOf(route).map((segment) => growBox(segmentBox(segment), 2.5 * ink)),
      ),
      { x: deck.x, y: deck.y - 1, width: deck.width, height: 2 },
      { x: deck.x, y: deck.y + deck.height - 1, width: deck.width, height: 2 },
      { x: deck.x - 1, y: deck.y, width: 2, height: deck.height },
      { x: deck.x + deck.width - 1, y: deck.y, width: 2, height: deck.height },
    ],
  };
}
