import type { LampsOfCircuit } from '@lampwright/trace';
import { FieldButton, GoOnButton } from '../../controls/field-button';
import { Ask, Panel, PanelAnswers, PanelBody, Stack } from '../../controls/panel';
import { StepHeading } from '../../controls/step-heading';
import { useRecord } from '../../store/trace-session';
import { useNames } from '../../words/use-names';
import { useTraceWords } from '../../words/use-trace-words';
import { FindingsList } from '../findings-list';

interface LampCheckSummaryProps {
  circuits: readonly LampsOfCircuit[];
  /** Looks at one circuit again. */
  onReopen: (circuit: string) => void;
}

/** Every circuit is checked: what stays on the record, and a way back to any of them. */
export function LampCheckSummary({ circuits, onReopen }: LampCheckSummaryProps) {
  const t = useTraceWords();
  const names = useNames();
  const record = useRecord();
  return (
    <Panel>
      <PanelBody>
        <StepHeading screen="lampsDone">{t('lampCheck.doneTitle')}</StepHeading>
        <FindingsList />
        <Ask>{t('lampCheck.lookAgain')}</Ask>
        <Stack>
          {circuits.map(({ circuit }) => (
            <FieldButton key={circuit} wide onTap={() => onReopen(circuit)}>
              {names.circuit(circuit)}
            </FieldButton>
          ))}
        </Stack>
      </PanelBody>
      <PanelAnswers>
        <GoOnButton wide onTap={() => void record({ type: 'lampCheck.finished' })}>
          {t('lampCheck.finish')}
        </GoOnButton>
      </PanelAnswers>
    </Panel>
  );
}
