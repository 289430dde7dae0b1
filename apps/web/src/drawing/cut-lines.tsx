import type { Cut } from './cuts';
import { colours } from './drawing-colours';
import type { Point } from './layout/geometry';
import type { PlacedFlag } from './layout/place-flags';

interface Props {
  cuts: readonly Cut[];
  flags: readonly PlacedFlag[];
}

/** The cut: an amber dashed line with a darker edge square across the wire, and a thin line to its flag. */
export function CutLines({ cuts, flags }: Props) {
  return (
    <g aria-hidden fill="none" strokeLinejoin="round">
      {cuts.map((cut) => {
        const flag = flags.find((placed) => placed.id === cut.id);
        const stroke = `M${cut.stroke[0].x} ${cut.stroke[0].y}L${cut.stroke[1].x} ${cut.stroke[1].y}`;
        return (
          <g key={cut.id} className="lw-cut-line" data-cut={cut.id}>
            {flag && (
              <>
                <path d={leaderPath(cut.leader, flag)} stroke={colours.sheet} strokeWidth={5} />
                <path d={leaderPath(cut.leader, flag)} stroke={colours.flag} strokeWidth={2} />
              </>
            )}
            <path d={stroke} stroke={colours.sheet} strokeWidth={10} opacity={0.9} />
            <path d={stroke} stroke={colours.amberEdge} strokeWidth={5.5} strokeDasharray="14 7" />
            <path d={stroke} stroke={colours.amber} strokeWidth={3.5} strokeDasharray="14 7" />
          </g>
        );
      })}
    </g>
  );
}

/** To the flag straight where it stands over the leader's end, else slanting to its near corner. */
function leaderPath(leader: readonly Point[], { box, edge }: PlacedFlag): string {
  const end = leader.at(-1) ?? { x: box.x, y: box.y };
  const x = Math.min(Math.max(end.x, box.x + 10), box.x + box.width - 10);
  const y = edge === 'top' ? box.y + box.height : box.y;
  return `M${leader.map((point) => `${point.x} ${point.y}`).join('L')}L${x} ${y}`;
}
