import { useTranslation } from 'react-i18next';
import { colours } from './drawing-colours';
import type { SheetText } from './sheet-texts';

export function SheetTexts({ texts, size }: { texts: readonly SheetText[]; size: number }) {
  const { t } = useTranslation('drawing');
  return (
    <g aria-hidden style={{ fontSize: size }} fill={colours.muted}>
      {texts.map(({ key, at, turn, anchor }) => (
        <text
          key={key}
          transform={`translate(${at.x} ${at.y}) rotate(${turn})`}
          textAnchor={anchor}
        >
          {t(key)}
        </text>
      ))}
    </g>
  );
}
