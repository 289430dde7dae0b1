import { LinkButton } from '../../../ui';
import { paths } from '../../../lib/paths';
import { GoOnButton } from '../controls/field-button';
import { Panel, PanelAnswers, PanelBody, Text } from '../controls/panel';
import { StepHeading } from '../controls/step-heading';
import { useTraceWords } from '../words/use-trace-words';

export function AbandonedStep({ onReplay }: { onReplay: () => void }) {
  const t = useTraceWords();
  return (
    <Panel>
      <PanelBody>
        <StepHeading screen="abandoned">{t('common:step.abandoned')}</StepHeading>
        <Text>{t('signed.abandoned')}</Text>
      </PanelBody>
      <PanelAnswers>
        <GoOnButton wide onTap={onReplay}>
          {t('signed.replay')}
        </GoOnButton>
        <LinkButton to={paths.yard()} wide>
          {t('common:toTheYard')}
        </LinkButton>
      </PanelAnswers>
    </Panel>
  );
}
