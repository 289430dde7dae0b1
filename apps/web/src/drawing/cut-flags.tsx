import { colours } from './drawing-colours';
import type { PlacedFlag } from './layout/place-flags';

interface Props {
  flags: readonly PlacedFlag[];
  fontSize: number;
}

/** The flags that name the points to be opened, on top of everything. */
export function CutFlags({ flags, fontSize }: Props) {
  return flags.map(({ id, box, edge, text }) => (
    <g key={id} aria-hidden data-flag={id}>
      <rect {...box} rx={8} fill={colours.flag} />
      <rect
        x={box.x + 10}
        y={edge === 'top' ? box.y + box.height - 3 : box.y}
        width={box.width - 20}
        height={3}
        fill={colours.amber}
      />
      <text
        x={box.x + box.width / 2}
        y={box.y + box.height / 2 + fontSize * 0.34}
        textAnchor="middle"
        style={{ fontSize, fontWeight: 700 }}
        fill={colours.onFlag}
      >
        {text}
      </text>
    </g>
  ));
}
