import { chakra } from '@chakra-ui/react';
import type { HarnessFault } from '@lampwright/harness';
import { useTranslation } from 'react-i18next';
import { useFaultWords } from '../../lib/use-fault-words';
import { Callout, Panel } from '../../ui';

const List = chakra('ol', {
  base: { pl: '6', display: 'flex', flexDirection: 'column', gap: '2' },
});
const Item = chakra('li', { base: { overflowWrap: 'anywhere' } });

/** Every fault of a plan, each in a sentence that names the place. */
export function FaultsFound({ faults, more }: { faults: readonly HarnessFault[]; more: boolean }) {
  const { t } = useTranslation('plans');
  const words = useFaultWords();
  return (
    <Panel>
      <Callout tone="caution" role="alert" title={t('faults', { count: faults.length })}>
        {t(more ? 'moreFaults' : 'faultsWords')}
      </Callout>
      <List>
        {faults.map((fault, at) => (
          <Item key={`${fault.path}:${fault.code}:${at}`}>{words(fault)}</Item>
        ))}
      </List>
    </Panel>
  );
}
