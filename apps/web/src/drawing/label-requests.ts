import type { Part, PartId } from '@lampwright/harness';
import type { Point } from './layout/geometry';
import { labelVariants, shortName } from './layout/label-lines';
import type { LabelRequest } from './layout/place-labels';
import type { DrawingMarks, PlaceMark } from './marks';
import { partMarks } from './place-marks';

interface Input {
  parts: readonly Part[];
  positions: ReadonlyMap<PartId, Point>;
  /** Half the side of a symbol. */
  reach: number;
  marks: DrawingMarks;
  pickable: (part: PartId) => boolean;
  /** Parts that a flag names already. */
  flagged: ReadonlySet<PartId>;
  /** Only what is cut, found or open. */
  few: boolean;
  /** Magnified enough to write out the names of splices, which no one can open. */
  near: boolean;
  /** The words for a part that is open or found, and the label of any other. */
  wording: (part: Part, what: 'open' | 'found' | 'plain') => string;
}

/** Which parts ask for a label, what it says and which goes first: cut, found, open, in question, then others. */
export function labelRequests(input: Input): LabelRequest[] {
  const { parts, positions, marks, flagged } = input;
  const cut = new Set(marks.cut);
  const open = new Set(marks.open);
  return parts.flatMap((part, at): LabelRequest[] => {
    const point = positions.get(part.id);
    if (!point || flagged.has(part.id)) return [];
    const mark = partMarks(part, marks.places).whole;
    const what = mark === 'found' ? 'found' : open.has(part.id) ? 'open' : 'plain';
    const leading = cut.has(part.id) || what !== 'plain';
    if (input.few && !leading) return [];
    const priority = cut.has(part.id)
      ? 0
      : what === 'found'
        ? 1
        : what === 'open'
          ? 2
          : 3 + (mark === 'inQuestion' ? 0 : 3) + rank(part, input.pickable);
    const code = shortName(part.label);
    const brief = part.kind === 'splice' && !input.near;
    const variants = brief ? (code ? [[code]] : []) : labelVariants(part.label, at + 1);
    return [
      {
        id: part.id,
        at: point,
        reach: input.reach * reachOf(part, mark),
        variants: leading ? [[input.wording(part, what)], ...variants] : variants,
        priority,
        bold: leading,
        mayLead: leading || mark === 'inQuestion' || part.kind === 'inlet',
      },
    ];
  });
}

/** A splice is a small dot; rings stand around what was found. */
function reachOf(part: Part, mark: PlaceMark): number {
  if (mark === 'found') return 2.5;
  return part.kind === 'splice' ? 0.5 : 1;
}

function rank(part: Part, pickable: (part: PartId) => boolean): number {
  if (pickable(part.id)) return 0;
  return part.kind === 'splice' ? 2 : 1;
}
