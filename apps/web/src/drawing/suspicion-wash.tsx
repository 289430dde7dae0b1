import type { Part, Run } from '@lampwright/harness';
import { colours } from './drawing-colours';
import type { Point } from './layout/geometry';
import type { DrawingMarks } from './marks';
import { pathOf } from './path-of';
import { partMarks, runMark } from './place-marks';

interface Props {
  id: string;
  parts: readonly Part[];
  runs: readonly Run[];
  positions: ReadonlyMap<string, Point>;
  routes: ReadonlyMap<string, Point[]>;
  places: DrawingMarks['places'];
  width: number;
  /** Size of the hatching as a share of its usual one: it keeps its size on the screen. */
  hatch: number;
}

/** A hatched ground under everything in question, as a marker pen would leave it along the harness. */
export function SuspicionWash({ id, parts, runs, positions, routes, places, width, hatch }: Props) {
  const paths = runs
    .filter((run) => runMark(run, places) === 'inQuestion')
    .map((run) => pathOf(routes.get(run.id) ?? [], 6));
  const spots = parts
    .filter((part) => partMarks(part, places).whole === 'inQuestion')
    .flatMap((part) => positions.get(part.id) ?? []);
  if (paths.length + spots.length === 0) return null;
  return (
    <g className="lw-wash">
      <defs>
        <pattern
          id={id}
          width={7}
          height={7}
          patternUnits="userSpaceOnUse"
          patternTransform={`rotate(45) scale(${hatch})`}
        >
          <rect width={7} height={7} fill={colours.amberWash} />
          <rect width={1.25} height={7} fill={colours.amber} opacity={0.34} />
        </pattern>
      </defs>
      <g
        stroke={`url(#${id})`}
        strokeWidth={width}
        strokeLinecap="round"
        strokeLinejoin="round"
        fill="none"
      >
        {paths.map((path) => (
          <path key={path} d={path} />
        ))}
        {spots.map(({ x, y }) => (
          <path key={`${x} ${y}`} d={`M${x} ${y}h0.01`} strokeWidth={width * 1.15} />
        ))}
      </g>
    </g>
  );
}
