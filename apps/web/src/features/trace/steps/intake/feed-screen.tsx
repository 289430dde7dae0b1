import { GoBackButton, GoOnButton } from '../../controls/field-button';
import { Panel, PanelAnswers, PanelBody, Row, Small } from '../../controls/panel';
import { StepHeading } from '../../controls/step-heading';
import { useTraceWords } from '../../words/use-trace-words';
import { FeedChoice } from '../feed-choice';
import type { IntakeScreenProps } from './complaint-screen';

export function FeedScreen({
  draft,
  change,
  complete,
  back,
  next,
}: IntakeScreenProps & { complete: boolean }) {
  const t = useTraceWords();
  return (
    <Panel>
      <PanelBody>
        <StepHeading screen="feed">{t('intake.feed')}</StepHeading>
        <Small>{t('intake.feedHelp')}</Small>
        <FeedChoice draft={draft} change={change} />
      </PanelBody>
      <PanelAnswers>
        <Row>
          <GoBackButton onTap={back}>{t('intake.back')}</GoBackButton>
          <GoOnButton disabled={!complete} onTap={next}>
            {t('intake.done')}
          </GoOnButton>
        </Row>
      </PanelAnswers>
    </Panel>
  );
}
