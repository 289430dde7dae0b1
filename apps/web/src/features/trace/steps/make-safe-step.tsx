import { cautionsFor, cautionsLeft } from '@lampwright/trace';
import { GoOnButton } from '../controls/field-button';
import { Panel, PanelAnswers, PanelBody, Small } from '../controls/panel';
import { StepHeading } from '../controls/step-heading';
import { useRecord, useTraceContext } from '../store/trace-session';
import { useTraceWords } from '../words/use-trace-words';
import { CautionTicks } from './caution-ticks';

/** The cautions that fit this trailer and feed, each ticked by hand. */
export function MakeSafeStep() {
  const t = useTraceWords();
  const record = useRecord();
  const context = useTraceContext((whole) => whole);
  const left = cautionsLeft(context).length;
  return (
    <Panel>
      <PanelBody>
        <StepHeading screen="makeSafe">{t('makeSafe.title')}</StepHeading>
        <Small>{t('makeSafe.help')}</Small>
        <CautionTicks cautions={cautionsFor(context)} />
      </PanelBody>
      <PanelAnswers>
        <GoOnButton
          wide
          disabled={left > 0}
          onTap={() => void record({ type: 'safety.confirmed' })}
        >
          {left > 0 ? t('makeSafe.left', { count: left }) : t('makeSafe.done')}
        </GoOnButton>
      </PanelAnswers>
    </Panel>
  );
}
