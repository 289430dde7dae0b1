import { meaningsFor } from '@lampwright/trace';
import { AnswerButton } from '../../controls/answer-button';
import { FieldButton } from '../../controls/field-button';
import { Ask, Panel, PanelAnswers, PanelBody, Small, Text } from '../../controls/panel';
import { StepHeading } from '../../controls/step-heading';
import { useRecord, useTraceContext } from '../../store/trace-session';
import { useUndo } from '../../store/use-undo';
import { useTraceWords } from '../../words/use-trace-words';

/** Readings that do not fit together: a person says what they mean, the program never does. */
export function ContradictionScreen() {
  const t = useTraceWords();
  const record = useRecord();
  const undo = useUndo();
  const kind = useTraceContext((context) => context.contradiction);
  const context = useTraceContext((whole) => whole);
  if (kind === null) return null;
  return (
    <Panel>
      <PanelBody>
        <StepHeading screen={`contradiction-${kind}`}>{t('contradiction.title')}</StepHeading>
        <Text>{t(`contradiction.${kind}`)}</Text>
        <Small>{t('contradiction.orUndo')}</Small>
        {undo && (
          <FieldButton name={undo.name} onTap={undo.run}>
            {undo.name}
          </FieldButton>
        )}
      </PanelBody>
      <PanelAnswers>
        <Ask>{t('contradiction.ask')}</Ask>
        {meaningsFor(context).map((meaning) => (
          <AnswerButton
            key={meaning}
            tone="plain"
            label={t(`contradiction.meaning.${meaning}`)}
            about={t(`contradiction.about.${meaning}`)}
            onTap={() => void record({ type: 'contradiction.explained', meaning })}
          />
        ))}
      </PanelAnswers>
    </Panel>
  );
}
