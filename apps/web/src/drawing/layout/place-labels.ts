import { BoxGrid } from './box-grid';
import { boxInside, growBox, type Box, type Point } from './geometry';
import { labelCandidates } from './label-candidates';
import { textWidth } from './text-width';

export interface LabelRequest {
  id: string;
  at: Point;
  /** Half the side of the symbol it belongs to. */
  reach: number;
  /** The ways it may be written, best first. */
  variants: readonly (readonly string[])[];
  /** Lower goes first. */
  priority: number;
  bold: boolean;
  /** True where it may stand off with a line to its symbol. */
  mayLead: boolean;
}

export interface PlacedLabel {
  id: string;
  lines: readonly string[];
  box: Box;
  bold: boolean;
  /** True where it stands so far off that it needs a line to its symbol. */
  leader: boolean;
}

export interface LabelSurroundings {
  sheet: Box;
  /** Nothing may be written over these: symbols, flags, texts of the drawing itself. */
  solid: readonly Box[];
  /** Writing over these is allowed and avoided, the more so the higher their cost: wires, outlines. */
  soft: readonly { box: Box; cost: number }[];
  /** Letter height in pixels of the drawing. */
  size: number;
}

export const LINE_HEIGHT = 1.16;
/** A longer way of writing is given up for a shorter one above this cost. */
const TOO_BUSY = 9;

/**
 * Places labels one by one, the most important first, each in its best free position; one that fits nowhere is written
 * shorter, and left out if that does not fit either. No label overlaps another or anything solid. Deterministic.
 */
export function placeLabels(
  requests: readonly LabelRequest[],
  surroundings: LabelSurroundings,
): PlacedLabel[] {
  const solid = new BoxGrid<null>();
  for (const box of surroundings.solid) solid.add(box, null);
  const soft = new BoxGrid<number>();
  for (const { box, cost } of surroundings.soft) soft.add(box, cost);

  const placed: PlacedLabel[] = [];
  for (const request of [...requests].sort((a, b) => a.priority - b.priority)) {
    const label = placeOne(request, surroundings, solid, soft);
    if (!label) continue;
    placed.push(label);
    solid.add(growBox(label.box, surroundings.size * 0.12), null);
  }
  return placed;
}

function placeOne(
  request: LabelRequest,
  { sheet, size }: LabelSurroundings,
  solid: BoxGrid<null>,
  soft: BoxGrid<number>,
): PlacedLabel | null {
  for (const lines of request.variants) {
    const last = lines === request.variants.at(-1);
    const width = Math.max(...lines.map((line) => textWidth(line, size, request.bold)));
    const height = lines.length * size * LINE_HEIGHT;
    let best: { label: PlacedLabel; cost: number } | null = null;
    for (const candidate of labelCandidates(request.at, request.reach, width, height, size)) {
      if (best && candidate.cost >= best.cost) continue;
      const { box, leader } = candidate;
      if (leader && !request.mayLead) continue;
      if (!boxInside(box, sheet) || solid.over(box).length > 0) continue;
      const cost = soft.over(box).reduce((sum, more) => sum + more, candidate.cost);
      const label = { id: request.id, lines, box, bold: request.bold, leader };
      if (!best || cost < best.cost) best = { label, cost };
    }
    if (best && (last || best.cost <= TOO_BUSY)) return best.label;
  }
  return null;
}
