import type { Run } from '@lampwright/harness';
import type { Connected } from './connected-parts';
import { colours } from './drawing-colours';
import type { Point } from './layout/geometry';
import { paintOrder, wireStyle } from './mark-style';
import type { DrawingMarks } from './marks';
import { pathOf } from './path-of';
import { runMark } from './place-marks';

interface Props {
  runs: readonly Run[];
  routes: ReadonlyMap<string, Point[]>;
  places: DrawingMarks['places'];
  connected: Connected;
  /** Line widths are divided by this as the drawing is magnified. */
  ink: number;
}

/** The runs, what matters more on top. A wire without power is dashed, whatever else is known of it. */
export function Wires({ runs, routes, places, connected, ink }: Props) {
  const drawn = runs
    .map((run) => ({ run, mark: runMark(run, places), route: routes.get(run.id) ?? [] }))
    .sort((a, b) => paintOrder.indexOf(a.mark) - paintOrder.indexOf(b.mark));
  return (
    <g fill="none" strokeLinejoin="round">
      {drawn.map(({ run, mark, route }) => {
        const style = wireStyle[mark];
        const path = pathOf(route, 6);
        const live = connected.runs.has(run.id);
        const dash = live ? undefined : `${7 * ink} ${5 * ink}`;
        const line = { d: path, strokeDasharray: dash };
        return (
          <g key={run.id} data-run={run.id} data-mark={mark}>
            <path d={path} stroke={colours.sheet} strokeWidth={(style.width + 4) * ink} />
            {style.casing && (
              <path {...line} stroke={style.casing} strokeWidth={(style.width + 2) * ink} />
            )}
            <path
              {...line}
              className="lw-line"
              stroke={style.stroke}
              strokeWidth={style.width * ink}
            />
          </g>
        );
      })}
    </g>
  );
}
