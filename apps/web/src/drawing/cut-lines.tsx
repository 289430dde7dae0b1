import { colours } from './drawing-colours';
import type { Cut } from './cuts';
import type { PlacedFlag } from './layout/place-flags';

interface Props {
  cuts: readonly Cut[];
  flags: readonly PlacedFlag[];
  fontSize: number;
}

/** The cut: an amber dashed line with an inked edge across the point to be opened, and a flag that names it. */
export function CutLines({ cuts, flags, fontSize }: Props) {
  return (
    <g aria-hidden>
      {cuts.map((cut) => {
        const flag = flags.find((placed) => placed.id === cut.id);
        const [start, end] = cut.line;
        const anchor = flag
          ? {
              x: flag.box.x + flag.box.width / 2,
              y: flag.edge === 'top' ? flag.box.y + flag.box.height : flag.box.y,
            }
          : start;
        const inside = flag
          ? Math.min(Math.max(end.x, flag.box.x + 8), flag.box.x + flag.box.width - 8)
          : start.x;
        const path = `M${inside} ${anchor.y}L${start.x} ${start.y}L${end.x} ${end.y}`;
        return (
          <g key={cut.id} className="lw-cut-line" fill="none" strokeLinejoin="round">
            <path d={path} stroke={colours.sheet} strokeWidth={8} opacity={0.85} />
            <path d={path} stroke={colours.amberEdge} strokeWidth={5} strokeDasharray="14 7" />
            <path d={path} stroke={colours.amber} strokeWidth={3} strokeDasharray="14 7" />
          </g>
        );
      })}
      {flags.map((flag) => (
        <g key={flag.id}>
          <rect {...flag.box} rx={8} fill={colours.flag} />
          <rect
            x={flag.box.x + 10}
            y={flag.edge === 'top' ? flag.box.y + flag.box.height - 3 : flag.box.y}
            width={flag.box.width - 20}
            height={3}
            fill={colours.amber}
          />
          <text
            x={flag.box.x + flag.box.width / 2}
            y={flag.box.y + flag.box.height / 2 + fontSize * 0.34}
            textAnchor="middle"
            fontSize={fontSize}
            fontWeight={700}
            fill={colours.onFlag}
          >
            {flag.text}
          </text>
        </g>
      ))}
    </g>
  );
}
