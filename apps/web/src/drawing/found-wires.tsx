import type { DrawingLayout } from './layout/layout-harness';
import type { DrawingMarks } from './marks';
import { FoundRings } from './parts';
import { middleOf } from './path-of';
import { runMark } from './place-marks';

interface Props {
  layout: DrawingLayout;
  places: DrawingMarks['places'];
  ink: number;
}

/** A wire that was found has its rings halfway. */
export function FoundWires({ layout, places, ink }: Props) {
  return layout.runs
    .filter((run) => runMark(run, places) === 'found')
    .map((run) => {
      const at = middleOf(layout.routes.get(run.id) ?? []);
      return (
        at && (
          <g key={run.id} transform={`translate(${at.x} ${at.y})`} fillOpacity={0}>
            <FoundRings size={layout.symbol * ink} ink={ink} />
          </g>
        )
      );
    });
}
