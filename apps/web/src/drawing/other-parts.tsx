import { colours } from './drawing-colours';
import type { Point } from './layout/geometry';

/** Parts of other circuits: faint dots, so that a person sees what else is near. */
export function OtherParts({ points, ink }: { points: readonly Point[]; ink: number }) {
  return (
    <g fill={colours.line} aria-hidden>
      {points.map(({ x, y }, at) => (
        <circle key={at} cx={x} cy={y} r={2.6 * ink} />
      ))}
    </g>
  );
}
