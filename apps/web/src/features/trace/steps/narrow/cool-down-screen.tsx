import { useState } from 'react';
import { Callout } from '../../../../ui';
import { GoBackButton, GoOnButton } from '../../controls/field-button';
import { Panel, PanelAnswers, PanelBody, Small, Text } from '../../controls/panel';
import { StepHeading } from '../../controls/step-heading';
import { useRecord, useTraceContext } from '../../store/trace-session';
import { useTraceWords } from '../../words/use-trace-words';
import { FeedChangeScreen } from './feed-change-screen';

/** Feeds that limit the current or put none through: changing to one ends the need to cool. */
const GENTLER = ['seriesLamp', 'tester', 'ohmmeter'] as const;

/** The shop's limit of hard trips is reached. */
export function CoolDownScreen() {
  const t = useTraceWords();
  const record = useRecord();
  const [changing, setChanging] = useState(false);
  const count = useTraceContext((context) => context.overloads);
  if (changing) return <FeedChangeScreen offered={GENTLER} back={() => setChanging(false)} />;
  return (
    <Panel>
      <PanelBody>
        <StepHeading screen="coolDown">{t('coolDown.title')}</StepHeading>
        <Text>{t('coolDown.help', { count })}</Text>
        <Callout tone="caution">{t('coolDown.stop')}</Callout>
      </PanelBody>
      <PanelAnswers>
        <Small>{t('coolDown.gentlerHelp')}</Small>
        <GoOnButton wide onTap={() => setChanging(true)}>
          {t('coolDown.gentler')}
        </GoOnButton>
        <GoBackButton wide onTap={() => void record({ type: 'coolDown.taken' })}>
          {t('coolDown.done')}
        </GoBackButton>
      </PanelAnswers>
    </Panel>
  );
}
