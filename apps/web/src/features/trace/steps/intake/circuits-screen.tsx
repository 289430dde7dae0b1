import { ChoiceCard } from '../../controls/choice-card';
import { FieldButton, GoBackButton, GoOnButton } from '../../controls/field-button';
import { Panel, PanelAnswers, PanelBody, Row, Small, Stack } from '../../controls/panel';
import { StepHeading } from '../../controls/step-heading';
import { useTraceContext } from '../../store/trace-session';
import { useTraceWords } from '../../words/use-trace-words';
import type { IntakeScreenProps } from './complaint-screen';

export function CircuitsScreen({ draft, change, back, next }: IntakeScreenProps) {
  const t = useTraceWords();
  const circuits = useTraceContext((context) => context.record.plan.harness.circuits);
  const toggle = (id: string) =>
    change({
      circuits: draft.circuits.includes(id)
        ? draft.circuits.filter((other) => other !== id)
        : // The plan's own order, whatever order they were touched in.
          circuits
            .map((circuit) => circuit.id)
            .filter((other) => other === id || draft.circuits.includes(other)),
    });
  return (
    <Panel>
      <PanelBody>
        <StepHeading screen="circuits">{t('intake.circuits')}</StepHeading>
        <Small>{t('intake.circuitsHelp')}</Small>
        <Stack>
          {circuits.map(({ id, name, pin, colour }) => (
            <ChoiceCard
              key={id}
              label={name}
              about={[pin === undefined ? null : t('page.pin', { pin }), colour]
                .filter(Boolean)
                .join(', ')}
              chosen={draft.circuits.includes(id)}
              onTap={() => toggle(id)}
            />
          ))}
        </Stack>
        <FieldButton onTap={() => change({ circuits: circuits.map(({ id }) => id) })}>
          {t('intake.all')}
        </FieldButton>
      </PanelBody>
      <PanelAnswers>
        <Row>
          <GoBackButton onTap={back}>{t('intake.back')}</GoBackButton>
          <GoOnButton disabled={draft.circuits.length === 0} onTap={next}>
            {t('intake.next')}
          </GoOnButton>
        </Row>
      </PanelAnswers>
    </Panel>
  );
}
