import type { PartId } from '@lampwright/harness';
import type { Connected } from './connected-parts';
import { colours } from './drawing-colours';
import { LampResultBadge } from './lamp-result-badge';
import type { DrawingLayout } from './layout/layout-harness';
import { paintOrder } from './mark-style';
import type { DrawingMarks, PlaceMark } from './marks';
import { PartSymbol } from './part-symbol';
import { partMarks } from './place-marks';

interface Props {
  layout: DrawingLayout;
  marks: DrawingMarks;
  connected: Connected;
  /** Parts with a ring that says they can be picked. */
  offered: ReadonlySet<PartId>;
  ink: number;
}

/** All symbols, what matters more on top. */
export function Parts({ layout, marks, connected, offered, ink }: Props) {
  const size = layout.symbol * ink;
  const open = new Set(marks.open);
  const cut = new Set(marks.cut);
  const drawn = layout.parts
    .map((part) => ({ part, of: partMarks(part, marks.places), at: layout.positions.get(part.id) }))
    .sort((a, b) => level(a) - level(b));
  function level({ part, of }: { part: { id: PartId }; of: { whole: PlaceMark } }) {
    return paintOrder.indexOf(of.whole) + (cut.has(part.id) ? paintOrder.length : 0);
  }
  return (
    <g>
      {drawn.map(({ part, of, at }) => {
        if (!at) return null;
        const result = marks.lamps?.get(part.id);
        const live = connected.parts.has(part.id) || open.has(part.id);
        return (
          <g
            key={part.id}
            transform={`translate(${at.x} ${at.y})`}
            data-part={part.id}
            data-mark={of.whole}
            className="lw-symbol"
            opacity={live ? 1 : 0.82}
          >
            {offered.has(part.id) && (
              <circle
                r={size * 0.74}
                fill="none"
                stroke={colours.ink}
                strokeWidth={1.25 * ink}
                strokeDasharray={`${2 * ink} ${2.5 * ink}`}
              />
            )}
            {of.whole === 'found' && <FoundRings size={size} ink={ink} />}
            <PartSymbol
              part={part}
              marks={of}
              size={cut.has(part.id) ? size * 1.3 : size}
              open={open.has(part.id)}
              turn={layout.turns.get(part.id) ?? 0}
              ink={ink}
            />
            {result && <LampResultBadge result={result} size={size} />}
          </g>
        );
      })}
    </g>
  );
}

/** Two rings around what was found. */
export function FoundRings({ size, ink }: { size: number; ink: number }) {
  return (
    <g fill="none" stroke={colours.ember}>
      <circle r={size * 0.85} fill={colours.emberWash} strokeWidth={3 * ink} />
      <circle r={size * 1.2} strokeWidth={1.5 * ink} />
    </g>
  );
}
