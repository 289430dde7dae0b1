import { chakra } from '@chakra-ui/react';
import { stepOf } from '@lampwright/trace';
import { Undo2 } from 'lucide-react';
import { useEffect, useRef } from 'react';
import { FieldButton } from '../controls/field-button';
import { useUndo } from '../store/use-undo';
import { useTraceContext, useTraceLog, useTraceSession } from '../store/trace-session';
import { outcomeWords } from '../words/outcome-words';
import { useNames } from '../words/use-names';
import { useTraceWords } from '../words/use-trace-words';

const Strip = chakra('div', {
  base: {
    display: 'flex',
    alignItems: 'stretch',
    gap: 'touch',
    paddingX: { base: '4', md: '5' },
    paddingY: '2.5',
    bg: 'bg.panel',
    borderTopWidth: '1px',
    borderColor: 'line',
  },
});
const Past = chakra('ol', {
  base: {
    display: 'flex',
    flex: '1',
    gap: '2.5',
    minWidth: '0',
    overflowX: 'auto',
    listStyle: 'none',
    scrollbarWidth: 'thin',
  },
});
const Item = chakra('li', {
  base: {
    flexShrink: 0,
    maxWidth: '240px',
    minHeight: 'field',
    paddingX: '3.5',
    paddingY: '1',
    borderWidth: '1.5px',
    borderColor: 'line',
    borderRadius: 'md',
    fontSize: 'sm',
    lineHeight: '1.3',
    '& strong': {
      display: 'block',
      overflow: 'hidden',
      textOverflow: 'ellipsis',
      whiteSpace: 'nowrap',
    },
  },
  variants: {
    now: { true: { borderColor: 'amber.edge', borderWidth: '2.5px', bg: 'amber.wash' } },
    faded: { true: { opacity: 0.6, textDecoration: 'line-through' } },
  },
});
const None = chakra('p', { base: { alignSelf: 'center', color: 'fg.muted', fontSize: 'sm' } });

/** The power-ups so far, the newest last, and the way back. */
export function HistoryStrip() {
  const t = useTraceWords();
  const names = useNames();
  const { store } = useTraceSession();
  const powerUps = useTraceContext((context) => context.powerUps);
  const feed = useTraceContext((context) => context.feed);
  const step = useTraceLog(stepOf);
  const undo = useUndo();
  const list = useRef<HTMLOListElement>(null);
  const openWords = (open: readonly string[]) =>
    open.length === 0
      ? t('page.allConnected')
      : t('page.open', { points: names.list(open.map(names.code)) });
  useEffect(() => {
    // Sideways alone: bringing the newest into view must not move the page away from the instruction.
    list.current?.scrollTo?.({ left: list.current.scrollWidth });
  }, [powerUps.length]);
  return (
    <Strip>
      <Past ref={list} aria-label={t('page.history')} tabIndex={0}>
        {powerUps.map((powerUp, index) => (
          <Item key={powerUp.eventId} faded={!powerUp.counts}>
            <strong>
              {index + 1} · {openWords(powerUp.open)}
            </strong>
            {outcomeWords(powerUp.seen, feed, t)}
          </Item>
        ))}
        {step === 'narrow' && store && (
          <Item now>
            <strong>{powerUps.length + 1}</strong>
            {t('page.waitingForReading')}
          </Item>
        )}
        {powerUps.length === 0 && step !== 'narrow' && (
          <li>
            <None>{t('page.historyEmpty')}</None>
          </li>
        )}
      </Past>
      {undo && (
        <FieldButton icon={Undo2} onTap={undo.run} name={undo.name}>
          {t('page.undo')}
        </FieldButton>
      )}
    </Strip>
  );
}
