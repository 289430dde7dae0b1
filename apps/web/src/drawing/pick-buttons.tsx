import type { Part, PartId } from '@lampwright/harness';
import type { MouseEvent, RefObject } from 'react';
import { colours } from './drawing-colours';
import type { Point } from './layout/geometry';
import { nearestTo } from './layout/hit';

interface Props {
  sheet: RefObject<HTMLElement | null>;
  parts: readonly Part[];
  /** On the screen, of the parts that can be picked. */
  points: ReadonlyMap<PartId, Point>;
  describe: (part: Part) => string;
  onPick: (part: PartId) => void;
}

/** Wide enough for a glove; where two overlap, the nearer part gets the touch. */
const TARGET = 56;

/** A real button over every part that can be picked. */
export function PickButtons({ sheet, parts, points, describe, onPick }: Props) {
  const pick = (event: MouseEvent, own: PartId) => {
    const frame = sheet.current?.getBoundingClientRect();
    // A click from the keyboard or a screen reader has no place of its own.
    const byHand = event.detail > 0 && frame;
    const touch = byHand
      ? { x: event.clientX - frame.left, y: event.clientY - frame.top }
      : undefined;
    onPick((touch && nearestTo(touch, points, TARGET)) ?? own);
  };
  return parts.map((part) => {
    const at = points.get(part.id);
    if (!at) return null;
    return (
      <button
        key={part.id}
        type="button"
        className="lw-pick"
        aria-label={describe(part)}
        onClick={(event) => pick(event, part.id)}
        style={{
          left: at.x - TARGET / 2,
          top: at.y - TARGET / 2,
          width: TARGET,
          height: TARGET,
          color: colours.amberEdge,
        }}
      />
    );
  });
}
