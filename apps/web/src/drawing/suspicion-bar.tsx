import { useId } from 'react';
import { useTranslation } from 'react-i18next';
import { colours } from './drawing-colours';
import './drawing.css';
import { barSlices } from './bar-slices';
import type { SuspicionBarProps } from './marks';

const HEIGHT = 28;

/** Every place a slice as wide as its probability: what is cleared hatched, what is in question solid amber. */
export function SuspicionBar({ slices }: SuspicionBarProps) {
  const { t } = useTranslation('drawing');
  const hatch = useId();
  const laid = barSlices(slices);
  const inQuestion = laid.filter((slice) => slice.state === 'inQuestion');
  const most = inQuestion.reduce<(typeof inQuestion)[number] | null>(
    (best, slice) => (best && best.probability >= slice.probability ? best : slice),
    null,
  );
  const words = [
    t('barLabel', {
      count: laid.length,
      cleared: laid.length - inQuestion.length,
      inQuestion: inQuestion.length,
    }),
    most && t('barMost', { label: most.label, percent: Math.round(most.share * 100) }),
  ];
  return (
    <svg
      role="img"
      aria-label={words.filter(Boolean).join(' ')}
      className="lw-bar"
      height={HEIGHT}
      style={{ borderColor: colours.ink, background: colours.sheet }}
    >
      <defs>
        <pattern
          id={hatch}
          width={8}
          height={8}
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <rect width={8} height={8} fill={colours.slateWash} />
          <rect width={2} height={8} fill={colours.slate} opacity={0.55} />
        </pattern>
      </defs>
      {laid.map((slice) => (
        <g key={slice.key} className="lw-slice">
          <rect
            x={`${slice.start * 100}%`}
            width={`${slice.share * 100}%`}
            height={HEIGHT}
            fill={slice.state === 'cleared' ? `url(#${hatch})` : colours.amber}
          />
          {slice.start > 0 && (
            <line
              x1={`${slice.start * 100}%`}
              x2={`${slice.start * 100}%`}
              y2={HEIGHT}
              stroke={slice.state === 'cleared' ? colours.slateWash : colours.sheet}
              strokeWidth={1}
            />
          )}
        </g>
      ))}
    </svg>
  );
}
