import type { LampColour } from '@lampwright/harness';
import { symbolStyle } from './mark-style';
import type { SymbolProps } from './symbol-props';

/** Below this size the signs inside would only be smudges. */
const SMALLEST_WITH_SIGN = 11;

/** Round is amber, square is red, a lozenge is white; a cross inside is a filament, a triangle an LED. */
export function LampSymbol({ part, marks, size, open, ink }: SymbolProps) {
  const style = symbolStyle[marks.whole];
  const d = size * 0.2;
  return (
    <g>
      <path
        d={lampShape(part.lamp?.colour, size)}
        fill={style.fill}
        stroke={style.stroke}
        strokeWidth={style.width * ink}
        strokeLinejoin="round"
        strokeDasharray={open ? `${3 * ink} ${2.5 * ink}` : undefined}
      />
      {size >= SMALLEST_WITH_SIGN &&
        (part.lamp?.technology === 'filament' ? (
          <path
            d={`M${-d} ${-d}L${d} ${d}M${d} ${-d}L${-d} ${d}`}
            stroke={style.inner}
            strokeWidth={1.5 * ink}
          />
        ) : (
          <path d={`M${-d * 0.8} ${-d}L${d} 0L${-d * 0.8} ${d}z`} fill={style.inner} />
        ))}
    </g>
  );
}

function lampShape(colour: LampColour | undefined, size: number): string {
  const r = size * 0.43;
  if (colour === 'red') {
    const s = size * 0.4;
    const c = size * 0.1;
    return `M${-s + c} ${-s}h${2 * (s - c)}a${c} ${c} 0 0 1 ${c} ${c}v${2 * (s - c)}a${c} ${c} 0 0 1 ${-c} ${c}h${-2 * (s - c)}a${c} ${c} 0 0 1 ${-c} ${-c}v${-2 * (s - c)}a${c} ${c} 0 0 1 ${c} ${-c}z`;
  }
  if (colour === 'white') {
    const s = size * 0.5;
    return `M0 ${-s}L${s} 0L0 ${s}L${-s} 0z`;
  }
  return `M${-r} 0a${r} ${r} 0 1 0 ${2 * r} 0a${r} ${r} 0 1 0 ${-2 * r} 0z`;
}
