import { Callout, TextArea } from '../../../../ui';
import { ChoiceCard } from '../../controls/choice-card';
import { GoOnButton } from '../../controls/field-button';
import { Panel, PanelAnswers, PanelBody, Stack } from '../../controls/panel';
import { StepHeading } from '../../controls/step-heading';
import { useTraceWords } from '../../words/use-trace-words';
import { AbandonButton } from './abandon-button';
import { complaints } from './complaints';
import type { IntakeDraft } from './intake-draft';

export interface IntakeScreenProps {
  draft: IntakeDraft;
  change: (part: Partial<IntakeDraft>) => void;
  back: () => void;
  next: () => void;
}

export function ComplaintScreen({ draft, change, next }: Omit<IntakeScreenProps, 'back'>) {
  const t = useTraceWords();
  return (
    <Panel>
      <PanelBody>
        <StepHeading screen="complaint">{t('intake.title')}</StepHeading>
        <Callout>{t('intake.rule')}</Callout>
        <Stack>
          {complaints.map((id) => (
            <ChoiceCard
              single
              key={id}
              label={t(`intake.choices.${id}`)}
              chosen={draft.complaint === id}
              onTap={() => change({ complaint: id })}
            />
          ))}
        </Stack>
        <TextArea
          size="field"
          label={t('intake.words')}
          value={draft.words}
          onChange={(event) => change({ words: event.target.value })}
        />
        <AbandonButton />
      </PanelBody>
      <PanelAnswers>
        <GoOnButton wide disabled={!draft.complaint && !draft.words.trim()} onTap={next}>
          {t('intake.next')}
        </GoOnButton>
      </PanelAnswers>
    </Panel>
  );
}
