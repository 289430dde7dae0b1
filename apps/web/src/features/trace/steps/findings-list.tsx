import { findings, type Finding } from '@lampwright/trace';
import { chakra } from '@chakra-ui/react';
import { Callout } from '../../../ui';
import { useTraceContext } from '../store/trace-session';
import { useNames } from '../words/use-names';
import { useTraceWords } from '../words/use-trace-words';

const List = chakra('ul', { base: { listStyle: 'disc', paddingInlineStart: '5' } });

/** What is not as it should be and stays on the record, or that there is nothing. */
export function FindingsList() {
  const t = useTraceWords();
  const names = useNames();
  const context = useTraceContext((whole) => whole);
  const left = findings(context);
  const words = (finding: Finding) => {
    const circuit = names.circuit(finding.circuit);
    if (finding.kind === 'darkCircuit') return `${circuit}: ${t('answer.darkShort')}`;
    const result = t(`lampCheck.result.${finding.result}`);
    return `${t('lampCheck.lamp', { lamp: names.part(finding.lamp), result })} (${circuit})`;
  };
  if (left.length === 0) return <Callout tone="done">{t('lampCheck.noFindings')}</Callout>;
  return (
    <Callout tone="next" title={t('lampCheck.findings')}>
      <List>
        {left.map((finding) => (
          <li key={JSON.stringify(finding)}>{words(finding)}</li>
        ))}
      </List>
    </Callout>
  );
}
