import { colours } from './drawing-colours';
import { symbolStyle } from './mark-style';
import type { SymbolProps } from './symbol-props';

/** Two mated halves, the feed half where the wire comes in; opened, they stand apart. */
export function PlugSymbol({ marks, size, open, turn, ink }: SymbolProps) {
  const half = size / 2;
  const height = size * 0.72;
  const apart = open ? size * 0.24 : 0;
  const feed = symbolStyle[marks.feed];
  const load = symbolStyle[marks.load];
  const r = Math.min(4, size * 0.16);
  const dash = open ? `${3 * ink} ${2.25 * ink}` : undefined;
  return (
    <g transform={`rotate(${turn})`}>
      {open && (
        <rect
          x={-apart}
          y={-height / 2 - 2}
          width={2 * apart}
          height={height + 4}
          fill={colours.sheet}
        />
      )}
      <g className="lw-half" style={{ transform: `translateX(${-apart}px)` }}>
        <path
          d={`M0 ${-height / 2}H${-half + r}a${r} ${r} 0 0 0 ${-r} ${r}v${height - 2 * r}a${r} ${r} 0 0 0 ${r} ${r}H0z`}
          fill={feed.fill}
          stroke={feed.stroke}
          strokeWidth={feed.width * ink}
        />
      </g>
      <g className="lw-half" style={{ transform: `translateX(${apart}px)` }}>
        <path
          d={`M0 ${-height / 2}H${half - r}a${r} ${r} 0 0 1 ${r} ${r}v${height - 2 * r}a${r} ${r} 0 0 1 ${-r} ${r}H0z`}
          fill={load.fill}
          stroke={load.stroke}
          strokeWidth={load.width * ink}
          strokeDasharray={dash}
        />
        {open && size >= 10 && (
          <path
            d={`M0 ${-height * 0.2}h${-apart * 0.9}M0 ${height * 0.2}h${-apart * 0.9}`}
            stroke={load.stroke}
            strokeWidth={1.75 * ink}
          />
        )}
      </g>
    </g>
  );
}
