import { suspectedCircuits } from '@lampwright/trace';
import { AnswerButton } from '../../controls/answer-button';
import { GoBackButton } from '../../controls/field-button';
import { Panel, PanelAnswers, PanelBody, Stack } from '../../controls/panel';
import { StepHeading } from '../../controls/step-heading';
import { useRecord, useTraceContext } from '../../store/trace-session';
import { useNames } from '../../words/use-names';
import { useTraceWords } from '../../words/use-trace-words';
import { Callout } from '../../../../ui';
import type { NarrowMode } from './narrow-mode';

interface ElseScreenProps {
  go: (mode: NarrowMode) => void;
  back: () => void;
}

/** What else a person may want to say instead of doing the next power-up. */
export function ElseScreen({ go, back }: ElseScreenProps) {
  const t = useTraceWords();
  const names = useNames();
  const record = useRecord();
  const context = useTraceContext((whole) => whole);
  const others = suspectedCircuits(context).filter((circuit) => circuit !== context.circuit);
  return (
    <Panel>
      <PanelBody>
        <StepHeading screen="else">{t('narrow.somethingElse')}</StepHeading>
        <Stack>
          <AnswerButton
            tone="plain"
            label={t('narrow.damage')}
            about={t('narrow.damageHelp')}
            onTap={() => go('damage')}
          />
          <AnswerButton
            tone="plain"
            label={t('narrow.planWrong')}
            about={t('narrow.planWrongAbout')}
            onTap={() => go('plan')}
          />
          <AnswerButton
            tone="plain"
            label={t('narrow.lookNow')}
            about={t('narrow.lookNowHelp')}
            onTap={() => void record({ type: 'inspection.started' })}
          />
          <AnswerButton tone="plain" label={t('feedChange.title')} onTap={() => go('feed')} />
          {others.map((circuit) => (
            <AnswerButton
              key={circuit}
              tone="plain"
              label={t('narrow.otherCircuit', { circuit: names.circuit(circuit) })}
              about={t('narrow.otherCircuitAbout')}
              onTap={() => {
                void record({ type: 'circuit.chosen', circuit }).then(back);
              }}
            />
          ))}
        </Stack>
        <Callout tone="caution">{t('coolDown.stop')}</Callout>
      </PanelBody>
      <PanelAnswers>
        <GoBackButton wide onTap={back}>
          {t('narrow.cancel')}
        </GoBackButton>
      </PanelAnswers>
    </Panel>
  );
}
