import type { Part } from '@lampwright/harness';
import { useId, useState, type ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { Button } from '../ui';
import { colours } from './drawing-colours';
import { legendParts } from './legend-parts';
import { wireStyle } from './mark-style';
import type { DrawingMarks, PlaceMark } from './marks';
import { PartSymbol } from './part-symbol';

interface Props {
  parts: readonly Part[];
  marks: DrawingMarks;
  /** The states stand in the row; else all is behind the button. */
  inline: boolean;
}

const IDLE = { feed: 'idle', load: 'idle', whole: 'idle' } as const;

/** What the lines mean, and by a button what the shapes mean; only what this drawing has. */
export function Legend({ parts, marks, inline }: Props) {
  const { t } = useTranslation('drawing');
  const [shown, setShown] = useState(false);
  const id = useId();
  const present = new Set(marks.places.values());
  const order: PlaceMark[] = ['inQuestion', 'cleared', 'found'];
  const states = (
    <>
      {order
        .filter((mark) => present.has(mark))
        .map((mark) => (
          <Entry key={mark} sign={<WireSign mark={mark} />}>
            {t(`mark.${mark}`)}
          </Entry>
        ))}
      {marks.open.length > 0 && <Entry sign={<WireSign mark="idle" off />}>{t('state.off')}</Entry>}
    </>
  );
  return (
    <div className="lw-legend">
      <Button
        look="quiet"
        aria-expanded={shown}
        aria-controls={id}
        onClick={() => setShown(!shown)}
      >
        {t('key')}
      </Button>
      {inline && <div className="lw-legend-row">{states}</div>}
      <div
        id={id}
        hidden={!shown}
        className="lw-legend-panel"
        style={{ background: colours.sheet, borderColor: colours.edge, color: colours.ink }}
      >
        {!inline && states}
        {legendParts(parts).map((part) => (
          <Entry
            key={part.id}
            sign={
              <svg viewBox="-12 -12 24 24" width={24} height={24} aria-hidden>
                <PartSymbol part={part} marks={IDLE} size={19} open={false} turn={0} ink={1} />
              </svg>
            }
          >
            {part.kind === 'lamp'
              ? `${t(`lamp.${part.lamp?.colour ?? 'plain'}`)}, ${t(`technology.${part.lamp?.technology ?? 'led'}`)}`
              : t(`kind.${part.kind}`)}
          </Entry>
        ))}
        {parts.some((part) => part.separable && part.kind === 'plug') && (
          <Entry
            sign={
              <svg viewBox="-14 -12 28 24" width={28} height={24} aria-hidden>
                <PartSymbol
                  part={{ id: '', kind: 'plug', label: '', at: { along: 0, across: 0 } }}
                  marks={IDLE}
                  size={17}
                  open
                  turn={0}
                  ink={1}
                />
              </svg>
            }
          >
            {t('state.open')}
          </Entry>
        )}
      </div>
    </div>
  );
}

function Entry({ sign, children }: { sign: ReactNode; children: ReactNode }) {
  return (
    <span className="lw-legend-entry">
      {sign}
      <span>{children}</span>
    </span>
  );
}

function WireSign({ mark, off = false }: { mark: PlaceMark; off?: boolean }) {
  const style = wireStyle[mark];
  const line = { d: 'M2 8H32', strokeDasharray: off ? '7 5' : undefined };
  return (
    <svg width={34} height={16} aria-hidden fill="none">
      {style.casing && <path {...line} stroke={style.casing} strokeWidth={style.width + 2} />}
      <path {...line} stroke={style.stroke} strokeWidth={style.width} />
    </svg>
  );
}
