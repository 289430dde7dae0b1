import { cautionsFor, cautionsLeft, type CautionId } from '@lampwright/trace';
import { ChoiceCard } from '../controls/choice-card';
import { GoOnButton } from '../controls/field-button';
import { Panel, PanelAnswers, PanelBody, Small, Stack } from '../controls/panel';
import { StepHeading } from '../controls/step-heading';
import { useRecord, useTraceContext } from '../store/trace-session';
import { useNames } from '../words/use-names';
import { useTraceWords } from '../words/use-trace-words';

/** The cautions that fit this trailer and feed, each ticked by hand. */
export function MakeSafeStep() {
  const t = useTraceWords();
  const names = useNames();
  const record = useRecord();
  const context = useTraceContext((whole) => whole);
  const left = cautionsLeft(context);
  const sources = names.list(
    context.record.trailer.secondSources.map((source) => t(`source.${source}`)),
  );
  const tick = (caution: CautionId) => {
    if (left.includes(caution)) void record({ type: 'caution.ticked', caution });
  };
  return (
    <Panel>
      <PanelBody>
        <StepHeading screen="makeSafe">{t('makeSafe.title')}</StepHeading>
        <Small>{t('makeSafe.help')}</Small>
        <Stack>
          {cautionsFor(context).map((caution) => (
            <ChoiceCard
              key={caution}
              label={t(`caution.${caution}.text`, { sources })}
              about={t(`caution.${caution}.source`)}
              chosen={!left.includes(caution)}
              onTap={() => tick(caution)}
            />
          ))}
        </Stack>
      </PanelBody>
      <PanelAnswers>
        <GoOnButton
          wide
          disabled={left.length > 0}
          onTap={() => void record({ type: 'safety.confirmed' })}
        >
          {left.length > 0 ? t('makeSafe.left', { count: left.length }) : t('makeSafe.done')}
        </GoOnButton>
      </PanelAnswers>
    </Panel>
  );
}
