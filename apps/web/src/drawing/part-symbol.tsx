import { colours } from './drawing-colours';
import { LampSymbol } from './lamp-symbol';
import { symbolStyle } from './mark-style';
import { PlugSymbol } from './plug-symbol';
import type { SymbolProps } from './symbol-props';

/** One part around the origin. Every kind has a shape of its own. */
export function PartSymbol(props: SymbolProps) {
  const { part, marks, size, open, ink } = props;
  const style = symbolStyle[marks.whole];
  const common = { fill: style.fill, stroke: style.stroke, strokeWidth: style.width * ink };
  const half = size / 2;
  switch (part.kind) {
    case 'plug':
      return <PlugSymbol {...props} />;
    case 'lamp':
      return <LampSymbol {...props} />;
    case 'splice':
      return (
        <circle
          r={Math.max(2, size * 0.2)}
          fill={
            marks.whole === 'inQuestion' || marks.whole === 'found' ? style.stroke : style.inner
          }
          stroke={colours.sheet}
          strokeWidth={1.5 * ink}
        />
      );
    case 'inlet': {
      const fill = marks.whole === 'inQuestion' ? colours.amber : colours.ink;
      const contact = marks.whole === 'inQuestion' ? colours.onAmber : colours.sheet;
      return (
        <g>
          <path
            d={`M${-half * 0.75} ${-half}h${size * 0.55}a${half * 0.35} ${half} 0 0 1 0 ${size}h${-size * 0.55}a3 3 0 0 1 -3 -3v${6 - size}a3 3 0 0 1 3 -3z`}
            fill={fill}
            stroke={colours.ink}
            strokeWidth={1.75 * ink}
          />
          {size >= 13 &&
            [-0.24, 0, 0.24].flatMap((row) =>
              [-0.16, 0.14].map((column) => (
                <circle
                  key={`${row} ${column}`}
                  cx={size * column}
                  cy={size * row}
                  r={size * 0.055}
                  fill={contact}
                />
              )),
            )}
        </g>
      );
    }
    case 'module':
      return (
        <g opacity={open ? 0.9 : 1}>
          <rect
            x={-half}
            y={-half * 0.8}
            width={size}
            height={size * 0.8}
            rx={2}
            {...common}
            strokeDasharray={open ? `${3 * ink} ${2.5 * ink}` : undefined}
          />
          <path
            d={[-0.28, 0, 0.28]
              .map(
                (x) =>
                  `M${size * x} ${-half * 0.8}v${-size * 0.14}M${size * x} ${half * 0.8}v${size * 0.14}`,
              )
              .join('')}
            stroke={style.stroke}
            strokeWidth={style.width * ink}
          />
          <rect
            x={-half * 0.5}
            y={-half * 0.35}
            width={half}
            height={size * 0.35}
            fill="none"
            stroke={style.inner}
            strokeWidth={1.25 * ink}
          />
        </g>
      );
  }
}
