import type { CircuitId } from '@lampwright/harness';
import { useState } from 'react';
import { Callout } from '../../../../ui';
import { ChoiceCard } from '../../controls/choice-card';
import { FieldButton, GoOnButton } from '../../controls/field-button';
import { Ask, Panel, PanelAnswers, PanelBody, Small, Stack, Text } from '../../controls/panel';
import { StepHeading } from '../../controls/step-heading';
import { useRecord, useTraceContext } from '../../store/trace-session';
import { outcomeWords } from '../../words/outcome-words';
import { useNames } from '../../words/use-names';
import { useTraceWords } from '../../words/use-trace-words';
import { ReadingAnswers } from '../reading-answers';

/** No circuit shows the fault: the wiggle check, or the plain result that nothing was found. */
export function NothingWrong() {
  const t = useTraceWords();
  const names = useNames();
  const record = useRecord();
  const [wiggling, setWiggling] = useState<CircuitId | null>(null);
  const feed = useTraceContext((context) => context.feed);
  const suspects = useTraceContext((context) => context.suspects);
  const wiggled = useTraceContext((context) => context.wiggled);
  if (!feed) return null;
  if (wiggling !== null) {
    return (
      <Panel>
        <PanelBody>
          <StepHeading screen={`wiggle-${wiggling}`}>
            {t('confirm.wiggleTitle', { circuit: names.circuit(wiggling) })}
          </StepHeading>
          <Text>{t('confirm.wiggleHelp')}</Text>
          <Callout tone="caution">{t('caution.noHolding.text')}</Callout>
        </PanelBody>
        <ReadingAnswers
          ask={<Ask>{t(`feed.${feed.kind}.ask`)}</Ask>}
          feed={feed}
          onAnswer={(outcome) => {
            setWiggling(null);
            void record({ type: 'wiggle.read', circuit: wiggling, outcome });
          }}
        >
          <FieldButton onTap={() => setWiggling(null)}>{t('intake.back')}</FieldButton>
        </ReadingAnswers>
      </Panel>
    );
  }
  return (
    <Panel>
      <PanelBody>
        <StepHeading screen="nothing">{t('confirm.nothingTitle')}</StepHeading>
        <Text>{t('confirm.nothingHelp')}</Text>
        <Ask>{t('confirm.wiggle')}</Ask>
        <Stack>
          {suspects.map((circuit) => {
            const seen = wiggled[circuit];
            return (
              <ChoiceCard
                key={circuit}
                label={names.circuitWithPin(circuit)}
                {...(seen ? { about: outcomeWords(seen, feed, t) } : {})}
                chosen={seen !== undefined}
                onTap={() => setWiggling(circuit)}
              />
            );
          })}
        </Stack>
      </PanelBody>
      <PanelAnswers>
        <Small>{t('confirm.nothingFoundHelp')}</Small>
        <GoOnButton wide onTap={() => void record({ type: 'nothing.found' })}>
          {t('confirm.nothingFound')}
        </GoOnButton>
      </PanelAnswers>
    </Panel>
  );
}
