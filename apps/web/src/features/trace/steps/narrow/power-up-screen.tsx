import type { PartId } from '@lampwright/harness';
import type { Seen } from '@lampwright/trace';
import { useMemo, useState } from 'react';
import { useAnnounce } from '../../controls/announcer';
import { FieldButton } from '../../controls/field-button';
import { Eyebrow, Panel, PanelBody, Row, Where } from '../../controls/panel';
import { StepHeading } from '../../controls/step-heading';
import { useShowOnDrawing } from '../../layout/overlay';
import { useRecord, useTraceContext } from '../../store/trace-session';
import type { NextPowerUp } from '../../store/use-next-power-up';
import { outcomeWords } from '../../words/outcome-words';
import { useNames } from '../../words/use-names';
import { useTraceWords } from '../../words/use-trace-words';
import { AmpsField, readAmps } from '../amps-field';
import { OrderOfDoing } from '../order-of-doing';
import { PowerOn } from '../power-on';
import { ReadingAnswers } from '../reading-answers';
import type { NarrowMode } from './narrow-mode';
import { Reason } from './reason';
import { useAnswerMeanings } from './use-answer-meanings';
import { usePoints } from './use-points';

interface PowerUpScreenProps {
  next: NextPowerUp;
  go: (mode: NarrowMode) => void;
  /** Picks another point; the same function on every render. */
  pick: (point: PartId) => void;
}

/** One instruction, one question, two or three answers. */
export function PowerUpScreen({ next, go, pick }: PowerUpScreenProps) {
  const t = useTraceWords();
  const names = useNames();
  const record = useRecord();
  const announce = useAnnounce();
  const circuit = useTraceContext((context) => context.circuit);
  const feed = useTraceContext((context) => context.feed);
  const hunt = useTraceContext((context) => context.hunt);
  const count = useTraceContext((context) => context.powerUps.length);
  const about = useAnswerMeanings(next.open);
  const [amps, setAmps] = useState('');
  const { pickable } = usePoints();
  useShowOnDrawing(
    useMemo(() => ({ cut: next.toOpen, pickable, onPick: pick }), [next.toOpen, pickable, pick]),
  );
  if (!feed || circuit === null) return null;

  const answer = async (outcome: Seen) => {
    const done = await record({
      type: 'reading.taken',
      circuit,
      open: next.open,
      outcome,
      ...readAmps(amps),
      advised: next.advised.open,
    });
    if (!done) return;
    setAmps('');
    announce(t('narrow.recorded', { outcome: outcomeWords(outcome, feed, t) }));
  };
  const title =
    next.toOpen.length > 0
      ? t('narrow.unplug', { points: names.parts(next.toOpen) })
      : next.toClose.length > 0
        ? t('narrow.plugIn', { points: names.parts(next.toClose) })
        : t('narrow.asIs');
  const [single] = next.toOpen;
  const n = count + 1;
  return (
    <Panel>
      <PanelBody>
        <Eyebrow>
          {hunt > 1 ? t('narrow.eyebrowHunt', { n, hunt }) : t('narrow.eyebrow', { n })}
        </Eyebrow>
        <StepHeading screen={`${n}:${next.open.join()}`}>{title}</StepHeading>
        {next.toOpen.length === 1 && single && names.where(single) && (
          <Where>{names.where(single)}</Where>
        )}
        <OrderOfDoing feed={feed} toClose={next.toClose} toOpen={next.toOpen} />
        <Reason next={next} />
        <AmpsField circuit={circuit} open={next.open} value={amps} onChange={setAmps} />
      </PanelBody>
      <ReadingAnswers
        ask={<PowerOn feed={feed} circuit={circuit} />}
        feed={feed}
        about={about}
        onAnswer={(outcome) => void answer(outcome)}
      >
        <Row css={{ '& > *': { flex: '1 1 auto' } }}>
          <FieldButton disabled={next.toOpen.length === 0} onTap={() => go('bar')}>
            {t('narrow.cantReach')}
          </FieldButton>
          <FieldButton onTap={() => go('pick')}>{t('narrow.another')}</FieldButton>
          <FieldButton onTap={() => go('else')}>{t('narrow.more')}</FieldButton>
        </Row>
      </ReadingAnswers>
    </Panel>
  );
}
