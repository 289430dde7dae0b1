import { boxAround, growBox, segmentBox, segmentsOf, type Box } from './layout/geometry';
import type { DrawingLayout } from './layout/layout-harness';
import type { LabelSurroundings } from './layout/place-labels';
import type { DrawingMarks } from './marks';
import type { SheetText } from './sheet-texts';

const WIRE = 2.2;
/** A label across the outline looks like a mistake. */
const OUTLINE = 12;

interface Input {
  layout: DrawingLayout;
  marks: DrawingMarks;
  texts: readonly SheetText[];
  flags: readonly Box[];
  ink: number;
  dimensionY: number | null;
}

/** What labels must keep off, and what they had better keep off. */
export function labelSurroundings(input: Input): Omit<LabelSurroundings, 'size'> {
  const { layout, texts, ink, dimensionY } = input;
  const { sheet, frame } = layout;
  const { deck } = frame;
  const scaleRow = { x: 0, y: sheet.height - 26, width: sheet.width, height: 26 };
  const dimension =
    dimensionY === null ? [] : [{ x: deck.x, y: dimensionY - 8, width: deck.width, height: 16 }];
  const wires = wireBoxes(layout, 2.5 * ink).map((box) => ({ box, cost: WIRE }));
  return {
    sheet: { x: 2, y: 2, width: sheet.width - 4, height: sheet.height - 4 },
    solid: [
      ...symbolBoxes(layout, ink),
      ...cutBoxes(layout, input.marks, ink),
      ...texts.map((text) => text.box),
      ...input.flags,
      scaleRow,
      ...dimension,
    ],
    soft: [...wires, ...edgesOf(deck).map((box) => ({ box, cost: OUTLINE }))],
  };
}

/** The squares that symbols fill. */
export function symbolBoxes(layout: DrawingLayout, ink: number): Box[] {
  return layout.parts.flatMap((part) => {
    const at = layout.positions.get(part.id);
    if (!at) return [];
    return boxAround(at, layout.symbol * ink * (part.kind === 'splice' ? 0.5 : 1.08));
  });
}

/** The straight pieces of all wires, so much thicker on either side. */
export function wireBoxes(layout: DrawingLayout, thicker: number): Box[] {
  return [...layout.routes.values()].flatMap((route) =>
    segmentsOf(route).map((segment) => growBox(segmentBox(segment), thicker)),
  );
}

/** The whole height of the sheet over every point to be parted: a line comes down there. */
export function cutBoxes(layout: DrawingLayout, marks: DrawingMarks, ink: number): Box[] {
  return marks.cut.flatMap((id): Box[] => {
    const at = layout.positions.get(id);
    return at ? [{ x: at.x - 5 * ink, y: 0, width: 10 * ink, height: layout.sheet.height }] : [];
  });
}

function edgesOf({ x, y, width, height }: Box): Box[] {
  return [
    { x, y: y - 1, width, height: 2 },
    { x, y: y + height - 1, width, height: 2 },
    { x: x - 1, y, width: 2, height },
    { x: x + width - 1, y, width: 2, height },
  ];
}
