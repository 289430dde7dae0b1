import { circuitsToProve, pointsToCloseFirst, type Seen } from '@lampwright/trace';
import { useState } from 'react';
import { Callout } from '../../../ui';
import { useAnnounce } from '../controls/announcer';
import { Eyebrow, Panel, PanelBody } from '../controls/panel';
import { StepHeading } from '../controls/step-heading';
import { useRecord, useTraceContext } from '../store/trace-session';
import { useNames } from '../words/use-names';
import { useTraceWords } from '../words/use-trace-words';
import { AmpsField, readAmps } from './amps-field';
import { ClosePoints } from './close-points';
import { PowerOn } from './power-on';
import { ReadingAnswers } from './reading-answers';

/** Power again after the repair; first, what parts the repaired place from the inlet is closed. */
export function ProveStep() {
  const t = useTraceWords();
  const names = useNames();
  const record = useRecord();
  const announce = useAnnounce();
  const [amps, setAmps] = useState('');
  const context = useTraceContext((whole) => whole);
  const { feed } = context;
  const [circuit] = circuitsToProve(context);
  if (!feed || circuit === undefined) return null;
  const toClose = pointsToCloseFirst(context, circuit);
  if (toClose.length > 0) {
    return (
      <Panel>
        <PanelBody>
          <Eyebrow>{t('prove.eyebrow')}</Eyebrow>
          <StepHeading screen={`close-${circuit}`}>{t('prove.closeFirst')}</StepHeading>
          <Callout tone="caution" title={t(`feed.${feed.kind}.off`)}>
            {t('prove.closeFirstHelp')}
          </Callout>
          <ClosePoints points={toClose} />
        </PanelBody>
      </Panel>
    );
  }
  const answer = async (outcome: Seen) => {
    const done = await record({ type: 'proof.read', circuit, outcome, ...readAmps(amps) });
    setAmps('');
    if (done) announce(t(outcome === 'holds' ? 'prove.holdsAbout' : 'prove.again'));
  };
  return (
    <Panel>
      <PanelBody>
        <Eyebrow>{t('prove.eyebrow')}</Eyebrow>
        <StepHeading screen={`prove-${circuit}`}>
          {t('prove.title', { circuit: names.circuitWithPin(circuit) })}
        </StepHeading>
        <Callout tone="caution">
          {t('caution.noHolding.text')} {t('caution.noBypass.text')}
        </Callout>
        <AmpsField circuit={circuit} open={context.open} value={amps} onChange={setAmps} />
      </PanelBody>
      <ReadingAnswers
        ask={<PowerOn feed={feed} circuit={circuit} />}
        feed={feed}
        about={{ overload: t('prove.overloadAbout'), holds: t('prove.holdsAbout') }}
        onAnswer={(outcome) => void answer(outcome)}
      />
    </Panel>
  );
}
