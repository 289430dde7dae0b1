import { useTranslation } from 'react-i18next';
import { colours } from './drawing-colours';
import type { Box } from './layout/geometry';
import { lengthParts } from './layout/scale-bar';
import type { LengthUnit } from './marks';

interface Props {
  deck: Box;
  y: number;
  lengthMetres: number;
  unit: LengthUnit;
  fontSize: number;
}

/** The trailer's length as a dimension line, as on any working drawing. */
export function LengthDimension({ deck, y, lengthMetres, unit, fontSize }: Props) {
  const { t } = useTranslation('drawing');
  const length = lengthParts(lengthMetres, unit);
  const text =
    'metres' in length
      ? t('metres', length)
      : length.inches
        ? t('feetInches', length)
        : t('feet', length);
  const right = deck.x + deck.width;
  const bottom = deck.y + deck.height;
  return (
    <g aria-hidden stroke={colours.edge} fill="none" strokeWidth={1}>
      <path
        d={`M${deck.x} ${bottom + 6}V${y + 5}M${right} ${bottom + 6}V${y + 5}`}
        strokeWidth={0.75}
      />
      <path d={`M${deck.x} ${y}H${right}`} />
      <path
        d={`M${deck.x} ${y}l9 -3v6zM${right} ${y}l-9 -3v6z`}
        fill={colours.edge}
        stroke="none"
      />
      <text
        x={deck.x + deck.width / 2}
        y={y + fontSize * 0.34}
        textAnchor="middle"
        style={{ fontSize }}
        fill={colours.muted}
        stroke={colours.paper}
        strokeWidth={fontSize * 0.9}
        paintOrder="stroke"
      >
        {text}
      </text>
    </g>
  );
}
