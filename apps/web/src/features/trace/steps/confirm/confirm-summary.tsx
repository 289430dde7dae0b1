import type { CircuitId } from '@lampwright/harness';
import { suspectedCircuits } from '@lampwright/trace';
import { GoOnButton } from '../../controls/field-button';
import { Ask, Panel, PanelAnswers, PanelBody } from '../../controls/panel';
import { StepHeading } from '../../controls/step-heading';
import { useRecord, useTraceContext } from '../../store/trace-session';
import { useNames } from '../../words/use-names';
import { useTraceWords } from '../../words/use-trace-words';
import { ConfirmedFacts } from './confirmed-facts';

/** What power showed, and which circuit is narrowed first. */
export function ConfirmSummary() {
  const t = useTraceWords();
  const names = useNames();
  const record = useRecord();
  const context = useTraceContext((whole) => whole);
  const short = suspectedCircuits(context);
  const narrow = async (circuit: CircuitId) => {
    const begun = await record({ type: 'confirm.finished' });
    // Narrowing begins on the first circuit by itself.
    if (begun && circuit !== short[0]) await record({ type: 'circuit.chosen', circuit });
  };
  return (
    <Panel>
      <PanelBody>
        <StepHeading screen="summary">{t('confirm.summaryTitle')}</StepHeading>
        <ConfirmedFacts />
      </PanelBody>
      <PanelAnswers>
        {short.length > 1 && <Ask>{t('confirm.choose')}</Ask>}
        {short.map((circuit) => (
          <GoOnButton key={circuit} wide onTap={() => void narrow(circuit)}>
            {t('confirm.narrowOne', { circuit: names.circuit(circuit) })}
          </GoOnButton>
        ))}
        {short.length === 0 && (
          <GoOnButton wide onTap={() => void record({ type: 'confirm.finished' })}>
            {t('confirm.noneShort')}
          </GoOnButton>
        )}
      </PanelAnswers>
    </Panel>
  );
}
