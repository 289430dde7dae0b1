import { useTranslation } from 'react-i18next';
import { colours } from './drawing-colours';
import type { Size } from './layout/frame';
import { scaleBar } from './layout/scale-bar';
import type { LengthUnit } from './marks';

interface Props {
  sheet: Size;
  /** Pixels a metre on the screen. */
  alongScale: number;
  acrossScale: number;
  unit: LengthUnit;
  fontSize: number;
}

/** A scale bar for lengths along the trailer, and how much wider it is drawn across. */
export function ScaleRow({ sheet, alongScale, acrossScale, unit, fontSize }: Props) {
  const { t } = useTranslation('drawing');
  const bar = scaleBar(alongScale, unit, Math.min(150, sheet.width / 3.2));
  const stretch = acrossScale / alongScale;
  const y = sheet.height - fontSize * 0.9;
  const part = bar.pixels / bar.parts;
  return (
    <g aria-hidden transform={`translate(12 ${y})`} style={{ fontSize }} fill={colours.muted}>
      <rect
        x={-6}
        y={-fontSize}
        width={sheet.width - 12}
        height={fontSize * 1.6}
        fill={colours.paper}
        opacity={0.85}
        stroke="none"
      />
      {Array.from({ length: bar.parts }, (_, at) => (
        <rect
          key={at}
          x={at * part}
          y={-6}
          width={part}
          height={5}
          fill={at % 2 ? colours.sheet : colours.ink}
          stroke={colours.ink}
          strokeWidth={1}
        />
      ))}
      <text x={bar.pixels + 8} y={0}>
        {unit === 'feet' ? t('feet', { feet: bar.length }) : t('metres', { metres: bar.length })}
        {stretch > 1.05 && (
          <tspan dx={14}>{t('stretched', { times: Math.round(stretch * 10) / 10 })}</tspan>
        )}
      </text>
    </g>
  );
}
